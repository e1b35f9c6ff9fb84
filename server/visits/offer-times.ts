import { and, eq, gt } from 'drizzle-orm';
import { jobs, visits } from '@/db/schema';
import {
  type CustomerHold,
  noWishes,
  type OfferedTimes,
  type Opening,
  type OpeningWishes,
} from '@/lib/contracts/openings';
import { eachStartOnce } from '@/lib/schedule';
import { addDays } from '@/lib/time/civil';
import { formatDay, formatWindow } from '@/lib/time/format-instant';
import { localDate } from '@/lib/time/local-moment';
import type { TextLocale } from '@/lib/time/text-locale';
import type { CustomerContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { openingsOfJob } from './find-openings';
import { readJobRecords } from './job-records';
import { type CustomerVisit, readCustomerVisit } from './read-customer-visit';

/** A choice that fits on a phone; who finds nothing in it rings the shop. */
const mostTimes = 6;
/** The shop has to be ready, and the day before is told of the evening before. */
const leastDaysAhead = 2;
const noon = '12:00';

/** Of a visit that fits into half a day, so many are offered after noon: who works in the mornings has a choice. */
const afternoonTimes = 3;
const halfDayMinutes = 240;

/** Other times for the customer's one visit, in their language and the site's zone, and what is kept for them. */
export async function offerTimes(ctx: CustomerContext): Promise<OfferedTimes> {
  const visit = await readCustomerVisit(ctx.db, ctx, ctx.actor.visitId);
  if (!['booked', 'confirmed'].includes(visit.status)) return { times: [], hold: null };
  const hold = await heldFor(ctx, visit);
  const times = await otherOpenings(ctx, visit, hold);
  return {
    hold,
    times: times.map(({ crewId, date, time, windowStartsAt, windowEndsAt }) => ({
      crewId,
      date,
      time,
      ...windowWordsOf(ctx, visit, {
        from: new Date(windowStartsAt),
        until: new Date(windowEndsAt),
      }),
    })),
  };
}

/** Each time once, in order: neither the one that they have, nor the one that is kept for them. */
async function otherOpenings(
  ctx: CustomerContext,
  visit: CustomerVisit,
  hold: CustomerHold | null,
): Promise<Opening[]> {
  const [record] = await ctx.db
    .select({ jobId: visits.jobId, workMinutes: visits.workMinutes })
    .from(visits)
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visit.id)));
  const [job] = record ? await readJobRecords(ctx.db, ctx, eq(jobs.id, record.jobId)) : [];
  if (!record || !job) throw notFound('visit');
  const known = [visit.windowStartsAt.toISOString(), hold?.startsAt];
  const find = (wishes: OpeningWishes, limit: number) =>
    openingsOfJob(
      ctx,
      job,
      {
        jobId: job.id,
        kind: visit.kind,
        visitId: visit.id,
        workMinutes: record.workMinutes,
        from: addDays(localDate(ctx.now, ctx.shop.zone), leastDaysAhead),
        isGateOverridden: false,
        wishes,
        limit,
      },
      (found) =>
        eachStartOnce(found.filter(({ startsAt }) => !known.includes(startsAt.toISOString()))),
    );
  const { openings: best } = await find(noWishes, mostTimes);
  const afterNoon = best.filter(({ time }) => time >= noon).length;
  const missing = record.workMinutes <= halfDayMinutes ? afternoonTimes - afterNoon : 0;
  const late = missing > 0 ? await find({ ...noWishes, notBefore: noon }, missing) : null;
  const more = (late?.openings ?? []).filter(({ missedWishes }) => missedWishes.length === 0);
  const chosen = [...best.slice(0, mostTimes - more.length), ...more];
  const inOrder = chosen.toSorted((a, b) => a.startsAt.localeCompare(b.startsAt));
  return inOrder.filter(({ startsAt }, index) => startsAt !== inOrder[index - 1]?.startsAt);
}

/** What is kept for the customer just now; null when nothing is, or its quarter of an hour is over. */
async function heldFor(ctx: CustomerContext, visit: CustomerVisit): Promise<CustomerHold | null> {
  const [held] = await ctx.db
    .select({
      id: visits.id,
      holdEndsAt: visits.holdEndsAt,
      from: visits.windowStartsAt,
      until: visits.windowEndsAt,
    })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.heldForVisitId, visit.id),
        eq(visits.status, 'held'),
        gt(visits.holdEndsAt, ctx.now),
      ),
    );
  if (!held?.holdEndsAt) return null;
  return {
    heldVisitId: held.id,
    startsAt: held.from.toISOString(),
    holdEndsAt: held.holdEndsAt.toISOString(),
    ...windowWordsOf(ctx, visit, held),
  };
}

function windowWordsOf(
  ctx: CustomerContext,
  { zone, language }: CustomerVisit,
  window: { from: Date; until: Date },
) {
  const locale: TextLocale = { language, region: ctx.shop.region };
  return {
    dayWords: formatDay(window.from, zone, locale),
    windowWords: formatWindow(window, zone, locale),
  };
}
