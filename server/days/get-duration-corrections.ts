import { and, asc, eq, gte, inArray, isNotNull } from 'drizzle-orm';
import { crewPeople, jobs, visitPauses, visitPieces, visits } from '@/db/schema';
import type {
  DurationCorrection,
  DurationCorrectionsView,
} from '@/lib/contracts/duration-corrections';
import {
  correctedMinutes,
  leastTimedVisits,
  workedMinutes,
} from '@/lib/schedule/duration-corrections';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { getWaitingList } from '@/server/visits/get-waiting-list';
import { estimateTakenApart } from '@/server/visits/job-facts';
import { readJobRecords } from '@/server/visits/job-records';

/** Older times tell of other people and other tools. */
const daysBack = 365;

const ruleOf = {
  'site-measure': 'measureMinutesPerRoom',
  install: 'installMinutesPerUnit',
} as const;
type TimedKind = keyof typeof ruleOf;

/** What the year's real times say about the minutes in the shop's rules. Nothing is changed by it. */
export async function getDurationCorrections(ctx: PersonContext): Promise<DurationCorrectionsView> {
  mustBeAllowed(ctx, 'numbers:read');
  const timed = await readTimedVisits(ctx);
  const view: DurationCorrectionsView = { corrections: [], tooFew: [] };
  for (const kind of ['site-measure', 'install'] as const) {
    const rule = ruleOf[kind];
    const own = timed.filter((visit) => visit.kind === kind);
    const correction = correctedMinutes(own, ctx.shop.rules.booking[rule]);
    if (correction) {
      view.corrections.push({
        rule,
        ...correction,
        words: words(kind, correction),
        waiting: await waitingOtherwise(ctx, rule, correction.offeredMinutes),
      });
    } else {
      const what = kind === 'install' ? 'installs' : 'measures';
      view.tooFew.push(`${own.length} ${what} were timed; from ${leastTimedVisits} on they tell.`);
    }
  }
  return view;
}

/** The waiting list by the rule as it is, beside the same list by what is offered. */
async function waitingOtherwise(
  ctx: PersonContext,
  rule: DurationCorrection['rule'],
  minutes: number,
): Promise<DurationCorrection['waiting']> {
  const { shop } = ctx;
  const booking = { ...shop.rules.booking, [rule]: minutes };
  const offered = await getWaitingList({
    ...ctx,
    shop: { ...shop, rules: { ...shop.rules, booking } },
  });
  const now = await getWaitingList(ctx);
  return offered.flatMap(({ jobId, jobNumber, kind, customerName, workMinutes: toMinutes }) => {
    const same = now.find((item) => item.jobId === jobId && item.kind === kind);
    if (!same || same.workMinutes === toMinutes) return [];
    return [{ jobId, jobNumber, customerName, fromMinutes: same.workMinutes, toMinutes }];
  });
}

async function readTimedVisits(ctx: PersonContext) {
  const shopId = ctx.shop.id;
  const done = await ctx.db
    .select({
      id: visits.id,
      jobId: visits.jobId,
      kind: visits.kind,
      crewId: visits.crewId,
      arrivedAt: visits.arrivedAt,
      leftAt: visits.leftAt,
    })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, shopId),
        eq(visits.status, 'done'),
        inArray(visits.kind, ['site-measure', 'install']),
        isNotNull(visits.arrivedAt),
        isNotNull(visits.leftAt),
        gte(visits.startsAt, new Date(ctx.now.getTime() - daysBack * 86_400_000)),
      ),
    )
    .orderBy(asc(visits.startsAt));
  if (done.length === 0) return [];
  const ids = done.map(({ id }) => id);
  const booked = await ctx.db
    .select({ visitId: visitPieces.visitId, from: visitPieces.startsAt, until: visitPieces.endsAt })
    .from(visitPieces)
    .where(and(eq(visitPieces.shopId, shopId), inArray(visitPieces.visitId, ids)));
  const taps = await ctx.db
    .select({ visitId: visitPauses.visitId, what: visitPauses.what, at: visitPauses.at })
    .from(visitPauses)
    .where(and(eq(visitPauses.shopId, shopId), inArray(visitPauses.visitId, ids)))
    .orderBy(asc(visitPauses.at));
  const members = await ctx.db
    .select({ crewId: crewPeople.crewId })
    .from(crewPeople)
    .where(eq(crewPeople.shopId, shopId));
  const records = await readJobRecords(
    ctx.db,
    ctx,
    inArray(jobs.id, [...new Set(done.map(({ jobId }) => jobId))]),
  );
  return done.flatMap((visit) => {
    const job = records.find(({ id }) => id === visit.jobId);
    const { arrivedAt, leftAt } = visit;
    if (!job || !arrivedAt || !leftAt) return [];
    const kind: TimedKind = visit.kind === 'install' ? 'install' : 'site-measure';
    const crewSize = Math.max(1, members.filter(({ crewId }) => crewId === visit.crewId).length);
    const actualMinutes = workedMinutes(
      { from: arrivedAt, until: leftAt },
      booked.filter(({ visitId }) => visitId === visit.id),
      pausesOf(
        taps.filter(({ visitId }) => visitId === visit.id),
        leftAt,
      ),
    );
    const people = kind === 'install' ? crewSize : 1;
    return [{ kind, actualMinutes, people, ...estimateTakenApart(job, { kind, crewSize }) }];
  });
}

/** From each tap on "pause" to the next on "go on"; a pause never ended lasts until they left. */
function pausesOf(taps: { what: 'pause' | 'go-on'; at: Date }[], leftAt: Date) {
  return taps.flatMap(({ what, at }, index) =>
    what === 'pause' && taps[index - 1]?.what !== 'pause'
      ? [{ from: at, until: taps.slice(index).find((tap) => tap.what === 'go-on')?.at ?? leftAt }]
      : [],
  );
}

function words(
  kind: TimedKind,
  found: Pick<DurationCorrection, 'nowMinutes' | 'offeredMinutes' | 'visitCount'>,
): string {
  const { nowMinutes, offeredMinutes, visitCount } = found;
  const [one, visitsWord] = kind === 'install' ? ['A unit', 'installs'] : ['A room', 'measures'];
  const agrees = offeredMinutes === nowMinutes;
  return `${one} takes ${offeredMinutes} min by ${visitCount} ${visitsWord}; the rule says ${agrees ? 'the same' : nowMinutes}.`;
}
