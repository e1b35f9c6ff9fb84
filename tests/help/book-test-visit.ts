import { randomUUID } from 'node:crypto';
import { type BookedVisit, type BookVisitInput, bookVisitInput } from '@/lib/contracts/visits';
import { bookVisit } from '@/server/visits/book-visit';
import { contextOf, type TestShop } from './make-shop';

/** A measure on Thursday 2026-12-10 at 09:00, booked on Tuesday the 1st at ten in New York, unless said otherwise. */
export async function bookTestVisit(
  shop: TestShop,
  given: Pick<BookVisitInput, 'jobId' | 'crewId'> & Partial<BookVisitInput>,
  now?: Date,
): Promise<BookedVisit> {
  return bookVisit(await contextOf(shop, 'scheduler', now), bookingOf(given));
}

export function bookingOf(
  given: Pick<BookVisitInput, 'jobId' | 'crewId'> & Partial<BookVisitInput>,
): BookVisitInput {
  return bookVisitInput.parse({
    idempotencyKey: randomUUID(),
    kind: 'site-measure',
    date: '2026-12-10',
    time: '09:00',
    ...given,
  });
}
