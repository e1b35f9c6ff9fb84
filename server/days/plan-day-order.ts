import type { CrewDay, DayPlanView, PlanDayInput } from '@/lib/contracts/day-plans';
import { planDay } from '@/lib/schedule/routes/plan-day';
import { type DaysPlan, planDays } from '@/lib/schedule/routes/plan-days';
import { formatLocalDay } from '@/lib/time/format-civil';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { crewDayView, dayTroubles } from './crew-day-view';
import { type DayToPlan, dayToPlan } from './day-to-plan';
import { readCrewDays } from './read-crew-days';

/** Plenty for a shop's day; the same question gets the same answer. */
const iterations = 6_000;
const seed = 1;
/** Less than this is no better order, only another one. */
const leastGainMinutes = 1;

/**
 * The day as it is driven and as it would be driven better: one crew's stops in another order, or the stops of
 * several crews given out anew. Promised windows are kept; what is under way stays. Nothing is written.
 */
export async function planDayOrder(
  ctx: PersonContext,
  { date, crewIds }: PlanDayInput,
): Promise<DayPlanView> {
  mustBeAllowed(ctx, 'visits:book');
  const days = await readCrewDays(ctx, date, crewIds);
  if (crewIds && days.length < new Set(crewIds).size) throw notFound('crew');
  const day = await dayToPlan(ctx, date, days);
  const now = day.crews.map((crew) => crewDayView(ctx, day, crew.id, null));
  const plan = dayTroubles(now).length > 0 ? mended(day) : orderedBetter(day);
  const better = plan
    ? day.crews.map((crew, index) =>
        crewDayView(ctx, day, crew.id, plan.routes[index]?.stops.map(({ id }) => id) ?? []),
      )
    : now;
  const nowDriveMinutes = drivenIn(now);
  const betterDriveMinutes = drivenIn(better);
  const isBetter =
    betterDriveMinutes <= nowDriveMinutes - leastGainMinutes ||
    dayTroubles(better).length < dayTroubles(now).length;
  const chosen = isBetter ? better : now;
  return {
    date,
    dayWords: formatLocalDay(date, { language: 'en', region: ctx.shop.region }),
    now,
    better: chosen,
    nowDriveMinutes,
    betterDriveMinutes: isBetter ? betterDriveMinutes : nowDriveMinutes,
    isDriveEstimated: day.isDriveEstimated,
    changes: isBetter ? changesOf(now, chosen) : [],
  };
}

/** A day that keeps its promises is where the search begins, so that it never ends worse. */
function orderedBetter(day: DayToPlan): DaysPlan | null {
  const [only, ...others] = day.crews;
  if (only && others.length === 0) {
    const exact = planDay({ stops: day.stops, crew: only, driveMinutes: day.driveMinutes }).value;
    if (exact) return { routes: [exact], driveMinutes: exact.driveMinutes, unplaced: [] };
  }
  return wholePlan(planDays({ ...day, seed, iterations }).value);
}

/** A day with drives that do not fit is planned from nothing. */
function mended(day: DayToPlan): DaysPlan | null {
  const { now: _, ...fromNothing } = day;
  return wholePlan(planDays({ ...fromNothing, seed, iterations }).value);
}

/** A plan that leaves a booked visit out is no plan. */
function wholePlan(plan: DaysPlan | null): DaysPlan | null {
  return plan && plan.unplaced.length === 0 ? plan : null;
}

function changesOf(now: CrewDay[], better: CrewDay[]): DayPlanView['changes'] {
  const places = new Map(
    now.flatMap(({ crewId, stops }) =>
      stops.map((stop) => [stop.visitId, { crewId, stop }] as const),
    ),
  );
  return better.flatMap(({ crewId, stops }) =>
    stops
      .filter(({ visitId, startsAt }) => {
        const before = places.get(visitId);
        return before?.crewId !== crewId || before.stop.startsAt !== startsAt;
      })
      .map(({ visitId, version, startsAt }) => ({ visitId, version, crewId, startsAt })),
  );
}

function drivenIn(days: CrewDay[]): number {
  return days.reduce((sum, { driveMinutes }) => sum + driveMinutes, 0);
}
