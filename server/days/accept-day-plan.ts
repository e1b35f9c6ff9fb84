import type { Transaction } from '@/db/database';
import type { AcceptDayPlanInput, AcceptedDayPlan, DayChange } from '@/lib/contracts/day-plans';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatTime } from '@/lib/time/format-instant';
import { localDate } from '@/lib/time/local-moment';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { onlyOnce } from '@/server/base/only-once';
import { Refusal } from '@/server/base/problem-response';
import { type Crew, lockCrew } from '@/server/visits/lock-crew';
import {
  changeVisit,
  type LockedVisit,
  lockVisit,
  mustBeCurrent,
} from '@/server/visits/lock-visit';
import { type Attempt, translateTakenTime } from '@/server/visits/taken-time';
import { mustBeMovable } from '@/server/visits/write-move';
import { removePieces, writePieces } from '@/server/visits/write-pieces';

/**
 * A better order of a day, all of it or nothing. The promised windows stay, so no customer is told anything; a
 * start outside its window is refused.
 */
export async function acceptDayPlan(
  ctx: PersonContext,
  input: AcceptDayPlanInput,
): Promise<AcceptedDayPlan> {
  mustBeAllowed(ctx, 'visits:book');
  let attempt: Attempt | null = null;
  return translateTakenTime(
    ctx,
    () => attempt,
    () =>
      ctx.db.transaction((tx) =>
        onlyOnce(tx, ctx, { verb: 'accept-day-plan', key: input.idempotencyKey }, () =>
          write(tx, ctx, input, (planned) => {
            attempt = planned;
          }),
        ),
      ),
  );
}

async function write(
  tx: Transaction,
  ctx: PersonContext,
  { changes, date }: AcceptDayPlanInput,
  onPlanned: (attempt: Attempt) => void,
): Promise<AcceptedDayPlan> {
  const inOrder = changes.toSorted((a, b) => a.visitId.localeCompare(b.visitId));
  const locked: { change: DayChange; visit: LockedVisit }[] = [];
  for (const change of inOrder) {
    const visit = await lockVisit(tx, ctx, change.visitId);
    await mustBeCurrent(tx, ctx, visit, change.version);
    mustBeMovable(visit);
    mustKeepPromise(ctx, visit, { startsAt: new Date(change.startsAt), date });
    locked.push({ change, visit });
  }
  const crews = new Map<string, Crew>();
  for (const crewId of [...new Set(inOrder.map((change) => change.crewId))].sort()) {
    crews.set(crewId, await lockCrew(tx, ctx, crewId));
  }
  // All times are given up before one is taken: two visits may change places.
  for (const { visit } of locked) await removePieces(tx, ctx, visit.id);
  for (const { change, visit } of locked) {
    const crew = crews.get(change.crewId);
    if (!crew) throw new Error('the crew was not locked');
    const startsAt = new Date(change.startsAt);
    const endsAt = new Date(startsAt.getTime() + (+visit.endsAt - +visit.startsAt));
    const pieces = [{ startsAt, endsAt }];
    const personIds = crew.people.map(({ id }) => id);
    onPlanned({ visitId: visit.id, crewId: crew.id, personIds, pieces });
    await changeVisit(tx, ctx, visit, { crewId: crew.id, startsAt, endsAt });
    await writePieces(tx, ctx, { visitId: visit.id, crew, pieces });
    await tellStory(tx, ctx, { visit, crew, startsAt });
  }
  return { changed: locked.length };
}

function mustKeepPromise(
  ctx: PersonContext,
  visit: LockedVisit,
  { startsAt, date }: { startsAt: Date; date: string },
): void {
  const { zone } = ctx.shop;
  const lastMinute = new Date(visit.endsAt.getTime() - 1);
  const isOneDay = localDate(visit.startsAt, zone) === localDate(lastMinute, zone);
  const isOfDay = isOneDay && localDate(visit.startsAt, zone) === date;
  // Where it stands outside its window already, staying there breaks nothing more.
  const isKept =
    (visit.windowStartsAt <= startsAt && startsAt <= visit.windowEndsAt) ||
    startsAt.getTime() === visit.startsAt.getTime();
  if (isOfDay && isKept && startsAt > ctx.now) return;
  throw new Refusal({
    status: 422,
    code: 'breaks-a-promise',
    message: `Nothing was changed. The ${visitKindWords[visit.kind].toLowerCase()} for ${visit.customerName} would leave its promised window or its day. Ask for a better order again.`,
  });
}

async function tellStory(
  tx: Transaction,
  ctx: PersonContext,
  { visit, crew, startsAt }: { visit: LockedVisit; crew: Crew; startsAt: Date },
): Promise<void> {
  const time = formatTime(startsAt, ctx.shop.zone, { language: 'en', region: ctx.shop.region });
  await writeAudit(tx, ctx, {
    verb: 'accept-day-plan',
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId: visit.jobId,
    summary: `${visitKindWords[visit.kind]} put at ${time} with ${crew.name}, within its promised window, for a day with less driving`,
    detail: { before: { crewId: visit.crewId, startsAt: visit.startsAt } },
  });
}
