import { submitRoomInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { submitRoom } from '@/server/walls/submit-room';

export const POST = handle(submitRoomInput, submitRoom);
