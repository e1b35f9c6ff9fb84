import { bookVisitInput, listVisitsInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { bookVisit } from '@/server/visits/book-visit';
import { listVisits } from '@/server/visits/list-visits';

export const GET = handle(listVisitsInput, listVisits);
export const POST = handle(bookVisitInput, bookVisit);
