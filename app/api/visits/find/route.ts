import { findVisitsInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { findVisits } from '@/server/visits/find-visits';

export const GET = handle(findVisitsInput, findVisits);
