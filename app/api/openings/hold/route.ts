import { holdOpeningInput } from '@/lib/contracts/openings';
import { handle } from '@/server/base/handle';
import { holdOpening } from '@/server/visits/hold-opening';

export const POST = handle(holdOpeningInput, holdOpening);
