import { changeJobInput, jobIdInput } from '@/lib/contracts/jobs';
import { handle } from '@/server/base/handle';
import { changeJob } from '@/server/jobs/change-job';
import { getJob } from '@/server/jobs/get-job';

export const GET = handle(jobIdInput, getJob);
export const PATCH = handle(changeJobInput, changeJob);
