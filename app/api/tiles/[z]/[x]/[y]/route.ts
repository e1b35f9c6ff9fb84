import { tileInput } from '@/lib/contracts/tiles';
import { handleFile } from '@/server/base/handle-file';
import { getTile } from '@/server/days/get-tile';

export const GET = handleFile(tileInput, getTile);
