import { saveRunsInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { saveRuns } from '@/server/walls/save-runs';

export const POST = handle(saveRunsInput, saveRuns);
