import { importListInput, mostListBytes } from '@/lib/contracts/job-lists';
import { handleUpload } from '@/server/base/handle-upload';
import { importList } from '@/server/jobs/import-list';

export const POST = handleUpload({ input: importListInput, mostBytes: mostListBytes }, importList);
