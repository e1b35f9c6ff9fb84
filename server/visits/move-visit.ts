import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { gateOverrides, jobs } from '@/db/schema';
import type { BookedVisit, MoveVisitInput } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { localDate } from '@/lib/time/local-moment';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { kickWorker } from '@/server/messages/worker';
import { overriddenWords, writeOverrides } from './book-visit';
import { readJobRecords } from './job-records';
import { lockCrew } from './lock-crew';
import { changeVisit, type LockedVisit, lockVisit, mustBeCurrent } from './lock-visit';
import { mustPassGates, type Plan, planVisit } from './plan-visit';
import { readVisit } from './read-visits';
import { type Attempt, translateTakenTime } from './taken-time';
import { tellMoved, toldWords } from './tell-customer';
import { keepVisitLink } from './visit-link';
import { writePieces } from './write-pieces';

/** To another time, crew or length. A time that the customer was not told of has to be confirmed anew. */
export async function moveVisit(ctx: PersonContext, input: MoveVisitInput): Promise<BookedVisit> {
  mustBeAllowed(ctx, 'visits:book');
  let attempt: Attempt | null = null;
  const moved = await translateTakenTime(
    ctx,
    () => attempt,
    () =>
      ctx.db.transaction((tx) =>
        write(tx, ctx, input, (planned) => {
          attempt = planned;
        }),
      ),
  );
  kickWorker();
  return moved;
}

async function write(
  tx: Transaction,
  ctx: PersonContext,
  input: MoveVisitInput,
  onPlanned: (attempt: Attempt) => void,
): Promise<BookedVisit> {
  const before = await lockVisit(tx, ctx, input.visitId);
  await mustBeCurrent(tx, ctx, before, input.version);
  mustBeMovable(before);
  const [job] = await readJobRecords(tx, ctx, eq(jobs.id, before.jobId));
  if (!job) throw notFound('job');
  const crew = await lockCrew(tx, ctx, input.crewId);
  const { date, time, workMinutes = before.workMinutes } = input;
  const plan = planVisit(ctx, job, crew, { kind: before.kind, date, time, workMinutes });
  const openGates = await notYetOverridden(tx, ctx, before.id, plan.openGates);
  mustPassGates(openGates, input.overrideReason);

  const isNews = changesWhatWasTold(ctx, before, plan);
  const { startsAt, endsAt, windowStartsAt, windowEndsAt } = plan;
  const after = await changeVisit(tx, ctx, before, {
    crewId: crew.id,
    startsAt,
    endsAt,
    windowStartsAt,
    windowEndsAt,
    workMinutes,
    ...(isNews ? { status: 'booked', confirmedAt: null, expectedAt: null, customerSays: '' } : {}),
  });
  const personIds = crew.people.map(({ id }) => id);
  onPlanned({ visitId: after.id, crewId: crew.id, personIds, pieces: plan.pieces });
  await writePieces(tx, ctx, { visitId: after.id, crew, pieces: plan.pieces });
  await writeOverrides(tx, ctx, { visitId: after.id, openGates, reason: input.overrideReason });
  await keepVisitLink(tx, ctx, { visitId: after.id, endsAt });
  const told = isNews ? await tellMoved(tx, ctx, after, before) : null;

  const view = await readVisit(tx, ctx, after.id);
  const where = `${view.dayWords}, ${view.windowWords}, with ${crew.name}`;
  await writeAudit(tx, ctx, {
    verb: 'move-visit',
    subjectKind: 'visit',
    subjectId: after.id,
    jobId: after.jobId,
    summary: `${visitKindWords[after.kind]} moved to ${where}${told ? `; ${toldWords(told)}` : ''}${overriddenWords(openGates, input.overrideReason)}`,
    detail: { before: timesOf(before), after: timesOf(after), told, openGates },
  });
  return { ...view, warnings: plan.warnings };
}

function mustBeMovable(visit: LockedVisit): void {
  const movable = ['held', 'booked', 'confirmed'];
  if (movable.includes(visit.status)) return;
  throw new Refusal({
    status: 409,
    code: 'visit-under-way-or-over',
    message: 'Nothing was changed: this visit is under way or over. Book another one.',
  });
}

/** A gate that was overridden for this visit once is not asked about again. */
async function notYetOverridden(
  tx: Transaction,
  ctx: PersonContext,
  visitId: string,
  openGates: Plan['openGates'],
): Promise<Plan['openGates']> {
  const known = await tx
    .select({ gate: gateOverrides.gate })
    .from(gateOverrides)
    .where(and(eq(gateOverrides.shopId, ctx.shop.id), eq(gateOverrides.visitId, visitId)));
  return openGates.filter(({ gate }) => !known.some((override) => override.gate === gate));
}

/** The customer knows the arrival and the last day; another crew or an hour more is no news to them. */
function changesWhatWasTold(ctx: PersonContext, before: LockedVisit, plan: Plan): boolean {
  const lastDay = (endsAt: Date) => localDate(new Date(endsAt.getTime() - 1), ctx.shop.zone);
  return (
    before.windowStartsAt.getTime() !== plan.windowStartsAt.getTime() ||
    before.windowEndsAt.getTime() !== plan.windowEndsAt.getTime() ||
    lastDay(before.endsAt) !== lastDay(plan.endsAt)
  );
}

function timesOf({ crewId, startsAt, endsAt, version }: LockedVisit) {
  return { crewId, startsAt, endsAt, version };
}
