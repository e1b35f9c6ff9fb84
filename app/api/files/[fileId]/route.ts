import { fileIdInput } from '@/lib/contracts/files';
import { handleFile } from '@/server/base/handle-file';
import { getFile } from '@/server/files/get-file';

export const GET = handleFile(fileIdInput, getFile);
