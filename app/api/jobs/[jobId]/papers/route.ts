import { addPaperInput, MOST_PAPER_BYTES } from '@/lib/contracts/papers';
import { handleUpload } from '@/server/base/handle-upload';
import { addPaper } from '@/server/files/add-paper';

export const POST = handleUpload({ input: addPaperInput, mostBytes: MOST_PAPER_BYTES }, addPaper);
