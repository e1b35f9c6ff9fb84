import { roomIdInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { getWallBook } from '@/server/walls/get-wall-book';

export const GET = handle(roomIdInput, getWallBook);
