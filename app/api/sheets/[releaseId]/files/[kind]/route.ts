import { sheetFileInput } from '@/lib/contracts/sheet-files';
import { handleFile } from '@/server/base/handle-file';
import { getSheetFile } from '@/server/sheets/get-sheet-file';

export const GET = handleFile(sheetFileInput, getSheetFile);
