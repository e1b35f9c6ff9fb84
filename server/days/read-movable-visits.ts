import { and, gt, inArray } from 'drizzle-orm';
import { visits } from '@/db/schema';
import type { VisitView } from '@/lib/contracts/visits';
import type { Context } from '@/server/base/context';
import { readVisits } from '@/server/visits/read-visits';

/** The booked visits of some jobs that have not begun. */
export function readMovableVisits(ctx: Context, jobIds: string[]): Promise<VisitView[]> {
  return readVisits(
    ctx.db,
    ctx,
    and(
      inArray(visits.jobId, jobIds),
      inArray(visits.status, ['booked', 'confirmed']),
      gt(visits.startsAt, ctx.now),
    ),
  );
}
