import { roomIdInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { getFit } from '@/server/sheets/get-fit';

export const GET = handle(roomIdInput, getFit);
