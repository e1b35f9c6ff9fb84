import { and, eq, gt, lt } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { visitPieces } from '@/db/schema';
import { addDays } from '@/lib/time/civil';
import { localDate, startOfLocalDay } from '@/lib/time/local-moment';
import type { PersonContext } from '@/server/base/context';
import type { OwnVisit } from './own-visit';

/** Whether the visit has work on the shop's day that it is now; one that was called off has none. */
export async function isVisitToday(
  db: Database,
  ctx: PersonContext,
  visit: OwnVisit,
): Promise<boolean> {
  if (visit.status === 'called-off') return false;
  const { zone } = ctx.shop;
  const date = localDate(ctx.now, zone);
  const [piece] = await db
    .select({ id: visitPieces.id })
    .from(visitPieces)
    .where(
      and(
        eq(visitPieces.shopId, ctx.shop.id),
        eq(visitPieces.visitId, visit.id),
        lt(visitPieces.startsAt, startOfLocalDay(addDays(date, 1), zone)),
        gt(visitPieces.endsAt, startOfLocalDay(date, zone)),
      ),
    )
    .limit(1);
  return piece !== undefined;
}
