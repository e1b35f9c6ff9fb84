import { and, gt, lt, ne } from 'drizzle-orm';
import { visits } from '@/db/schema';
import type { ListVisitsInput, VisitView } from '@/lib/contracts/visits';
import { startOfLocalDay } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readVisits } from './read-visits';

/** The diary's visits from one day up to another; those called off are in the job's story. */
export async function listVisits(ctx: PersonContext, input: ListVisitsInput): Promise<VisitView[]> {
  mustBeAllowed(ctx, 'visits:read');
  const { zone } = ctx.shop;
  return readVisits(
    ctx.db,
    ctx,
    and(
      lt(visits.startsAt, startOfLocalDay(input.to, zone)),
      gt(visits.endsAt, startOfLocalDay(input.from, zone)),
      ne(visits.status, 'called-off'),
    ),
  );
}
