import { and, eq } from 'drizzle-orm';
import { jobs, visits } from '@/db/schema';
import type { FindOpeningsInput, OpeningsView } from '@/lib/contracts/openings';
import { type FoundOpening, readinessFor, variedOpenings } from '@/lib/schedule';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import { type Context, mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { bookingDays } from '@/server/shops/booking-days';
import { factsOf } from './job-facts';
import { type JobRecord, readJobRecords } from './job-records';
import { openingView } from './opening-view';
import { searchOpenings } from './search-openings';

/** Nobody promises further ahead on the phone. */
const horizonDays = 90;

/** Times that work for a visit, best first, each with its reason. Nothing is written. */
export async function findOpenings(
  ctx: PersonContext,
  input: FindOpeningsInput,
): Promise<OpeningsView> {
  mustBeAllowed(ctx, 'visits:book');
  const [job] = await readJobRecords(ctx.db, ctx, eq(jobs.id, input.jobId));
  if (!job) throw notFound('job');
  const moved = input.visitId ? await visitOfJob(ctx, { ...input, visitId: input.visitId }) : null;
  return openingsOfJob(ctx, job, {
    ...input,
    workMinutes: input.workMinutes ?? moved?.workMinutes,
  });
}

/** The same for whoever asks: the office, or a customer for their own visit, from whom some are kept back. */
export async function openingsOfJob(
  ctx: Context,
  job: JobRecord,
  input: FindOpeningsInput,
  offerable: (found: FoundOpening[]) => FoundOpening[] = (found) => found,
): Promise<OpeningsView> {
  const today = localDate(ctx.now, ctx.shop.zone);
  const locale = { language: 'en', region: ctx.shop.region } as const;
  const readiness = readinessFor({
    kind: input.kind,
    facts: factsOf(ctx, job),
    rules: bookingDays(ctx),
    today,
    locale,
  });
  const gates = { state: readiness.state, from: readiness.from, gateWords: readiness.words };
  const none = (whyNone: string): OpeningsView => ({ ...gates, openings: [], found: 0, whyNone });

  const gateDay = input.isGateOverridden ? today : readiness.from;
  if (!gateDay) {
    return none(`Nothing is offered, ${readiness.words}. Settle that, or write why it is booked.`);
  }
  const from = latest([input.from ?? today, gateDay, today]);
  const until = input.until ?? addDays(from, horizonDays - 1);
  const lastDay = formatLocalDayShort(until, locale);
  if (until < from) {
    return none(`Nothing is offered until ${lastDay}: ${readiness.words}. Ask for later days.`);
  }
  const search = await searchOpenings(ctx, job, { ...input, from, until });
  if (search.crewCount === 0) return none(noCrewWords(input));
  const found = offerable(search.found);
  if (found.length === 0) {
    return none(
      `Nothing is free until ${lastDay}. Allow later days or other crews, or shorten the visit.`,
    );
  }
  return {
    ...gates,
    openings: variedOpenings(found, input.limit).map((opening) =>
      openingView(ctx, opening, search, input.wishes),
    ),
    found: found.length,
    whyNone: '',
  };
}

/** Its own time counts as free only when it is a visit of this job and kind. */
async function visitOfJob(ctx: Context, input: FindOpeningsInput & { visitId: string }) {
  const [visit] = await ctx.db
    .select({ workMinutes: visits.workMinutes })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.id, input.visitId),
        eq(visits.jobId, input.jobId),
        eq(visits.kind, input.kind),
      ),
    );
  if (!visit) throw notFound('visit');
  return visit;
}

function noCrewWords({ kind, crewIds, peopleNeeded = 1 }: FindOpeningsInput): string {
  const what = visitKindWords[kind].toLowerCase();
  const people = peopleNeeded > 1 ? ` with ${peopleNeeded} people` : '';
  return crewIds
    ? `None of the chosen crews${people} goes out for this: ${what}. Choose others.`
    : `No crew${people} goes out for this: ${what}. Make one in Crews.`;
}

function latest(days: LocalDate[]): LocalDate {
  return days.toSorted().at(-1) ?? '';
}
