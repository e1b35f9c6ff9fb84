import { and, eq, exists, gt, lt, notInArray } from 'drizzle-orm';
import { visitPieces, visits } from '@/db/schema';
import type { TodayInput, TodayView } from '@/lib/contracts/visits';
import { addDays } from '@/lib/time/civil';
import { formatLocalDay } from '@/lib/time/format-civil';
import { localDate, startOfLocalDay } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readVisits } from '@/server/visits/read-visits';
import { ofOwnCrews } from './own-crews';
import { readSnagsToMend } from './read-snags-to-mend';
import { withDrives } from './with-drives';
import { withRooms } from './with-rooms';

/** What is to be done on a day, in order; a visit of several days is on each day that it has work. */
export async function getToday(ctx: PersonContext, input: TodayInput): Promise<TodayView> {
  mustBeAllowed(ctx, 'visits:read');
  const { zone, region } = ctx.shop;
  const date = input.date ?? localDate(ctx.now, zone);
  const isOnDay = ctx.db
    .select({ id: visitPieces.id })
    .from(visitPieces)
    .where(
      and(
        eq(visitPieces.shopId, ctx.shop.id),
        eq(visitPieces.visitId, visits.id),
        lt(visitPieces.startsAt, startOfLocalDay(addDays(date, 1), zone)),
        gt(visitPieces.endsAt, startOfLocalDay(date, zone)),
      ),
    );
  const found = await readVisits(
    ctx.db,
    ctx,
    and(exists(isOnDay), notInArray(visits.status, ['held', 'called-off']), ofOwnCrews(ctx)),
  );
  return {
    date,
    dayWords: formatLocalDay(date, { language: 'en', region }),
    visits: await withDrives(ctx, await withRooms(ctx, found)),
    snags: await readSnagsToMend(ctx),
  };
}
