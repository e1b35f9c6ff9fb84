import { and, asc, eq, gt, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, visitPieces, visits } from '@/db/schema';
import type { VisitOutside } from '@/lib/contracts/crews';
import { goesOutFor } from '@/lib/schedule/crew-kinds';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatLocalDayShort, formatLocalTime } from '@/lib/time/format-civil';
import { toLocal } from '@/lib/time/local-moment';
import type { TextLocale } from '@/lib/time/text-locale';
import type { Context } from '@/server/base/context';
import { bookingDays } from '@/server/shops/booking-days';
import { type CrewPlan, readCrewPlans, whoGoes, whoIsOff } from '@/server/shops/crew-plans';

/** Visits of these may still be moved; the others are under way or over. */
export const movableStatuses = ['held', 'booked', 'confirmed'] as const;

/** Visits to come that stand where their crew does not work, each with why; nothing moves them but people. */
export async function visitsOutside(
  db: Database,
  ctx: Context,
  crewIds?: string[],
): Promise<VisitOutside[]> {
  const plans = new Map((await readCrewPlans(db, ctx, crewIds)).map((plan) => [plan.id, plan]));
  if (plans.size === 0) return [];
  const pieces = await db
    .select({
      visitId: visits.id,
      kind: visits.kind,
      crewId: visits.crewId,
      jobId: jobs.id,
      jobNumber: jobs.number,
      customerName: customers.name,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
    })
    .from(visitPieces)
    .innerJoin(visits, eq(visits.id, visitPieces.visitId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(visitPieces.shopId, ctx.shop.id),
        gt(visitPieces.endsAt, ctx.now),
        inArray(visits.status, [...movableStatuses]),
        inArray(visitPieces.crewId, [...plans.keys()]),
      ),
    )
    .orderBy(asc(visitPieces.startsAt));
  const closed = new Set(bookingDays(ctx).closedDays);
  const locale: TextLocale = { language: 'en', region: ctx.shop.region };
  const outside = new Map<string, VisitOutside>();
  for (const { kind, startsAt, endsAt, ...visit } of pieces) {
    const crew = plans.get(visit.crewId);
    if (!crew || outside.has(visit.visitId)) continue;
    const times = timesOf(startsAt, endsAt, ctx.shop.zone);
    const why = whyOutside({ crew, kind, ...times }, closed, locale);
    if (!why) continue;
    const words = `${visitKindWords[kind]}, ${formatLocalDayShort(times.date, locale)}`;
    outside.set(visit.visitId, { ...visit, crewName: crew.name, date: times.date, words, why });
  }
  return [...outside.values()];
}

/** What a change leaves outside that was not outside before. */
export function newlyOutside(before: VisitOutside[], after: VisitOutside[]): VisitOutside[] {
  const known = new Set(before.map(({ visitId, why }) => `${visitId} ${why}`));
  return after.filter(({ visitId, why }) => !known.has(`${visitId} ${why}`));
}

type Stands = { crew: CrewPlan; kind: VisitKind; date: string; start: string; end: string };

function whyOutside(stands: Stands, closed: Set<string>, locale: TextLocale): string | null {
  const { crew, kind, date, start, end } = stands;
  const time = (text: string) => formatLocalTime(text, locale);
  if (!goesOutFor(crew, kind)) return `${crew.name} does not go out for this`;
  const hours = crew.calendar.hoursOn(date);
  if (!hours) {
    if (closed.has(date)) return 'the shop is closed';
    const off = whoIsOff(crew, date).map(({ name }) => name);
    if (off.length > 0) return `${off.join(' and ')} ${off.length > 1 ? 'are' : 'is'} off`;
    if (crew.people.length > 0 && whoGoes(crew, date).length === 0) {
      return 'nobody goes with the crew on that day';
    }
    return `not a working day of ${crew.name}`;
  }
  if (start < hours.start) {
    return `begins at ${time(start)}, the crew's day at ${time(hours.start)}`;
  }
  return end > hours.end ? `ends at ${time(end)}, the crew's day at ${time(hours.end)}` : null;
}

/** A piece that ends at midnight ends on its own day. */
function timesOf(startsAt: Date, endsAt: Date, zone: string) {
  const { date, time: start } = toLocal(startsAt, zone);
  const last = toLocal(endsAt, zone);
  return { date, start, end: last.date > date ? '23:59' : last.time };
}
