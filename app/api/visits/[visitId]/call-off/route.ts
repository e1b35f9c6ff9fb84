import { callOffVisitInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { callOffVisit } from '@/server/visits/call-off-visit';

export const POST = handle(callOffVisitInput, callOffVisit);
