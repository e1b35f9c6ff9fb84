import { listJobsInput, startJobInput } from '@/lib/contracts/jobs';
import { handle } from '@/server/base/handle';
import { listJobs } from '@/server/jobs/list-jobs';
import { startJob } from '@/server/jobs/start-job';

export const GET = handle(listJobsInput, listJobs);
export const POST = handle(startJobInput, startJob);
