import { blankBookInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { startWallBook } from '@/server/walls/start-wall-book';

export const GET = handle(blankBookInput, startWallBook);
