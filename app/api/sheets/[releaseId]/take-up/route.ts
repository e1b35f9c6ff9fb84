import { takeUpSheetInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { takeUpSheet } from '@/server/sheets/take-up-sheet';

export const POST = handle(takeUpSheetInput, takeUpSheet);
