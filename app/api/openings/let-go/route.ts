import { heldVisitInput } from '@/lib/contracts/openings';
import { handle } from '@/server/base/handle';
import { letGoHeldTime } from '@/server/visits/let-go-held-time';

export const POST = handle(heldVisitInput, letGoHeldTime);
