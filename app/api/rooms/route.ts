import { jobIdInput } from '@/lib/contracts/jobs';
import { saveRoomInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { listRooms } from '@/server/walls/list-rooms';
import { saveRoom } from '@/server/walls/save-room';

export const GET = handle(jobIdInput, listRooms);
export const POST = handle(saveRoomInput, saveRoom);
