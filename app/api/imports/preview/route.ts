import { mostListBytes, previewListInput } from '@/lib/contracts/job-lists';
import { handleUpload } from '@/server/base/handle-upload';
import { previewList } from '@/server/jobs/preview-list';

export const POST = handleUpload(
  { input: previewListInput, mostBytes: mostListBytes },
  previewList,
);
