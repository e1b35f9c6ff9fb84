import { releaseSheetInput, sheetInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { getSheet } from '@/server/sheets/get-sheet';
import { releaseSheet } from '@/server/sheets/release-sheet';

export const GET = handle(sheetInput, getSheet);
export const POST = handle(releaseSheetInput, releaseSheet);
