import { heldVisitInput } from '@/lib/contracts/openings';
import { handle } from '@/server/base/handle';
import { takeHeldTime } from '@/server/visits/take-held-time';

export const POST = handle(heldVisitInput, takeHeldTime);
