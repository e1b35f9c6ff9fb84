import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { gateOverrides, jobs } from '@/db/schema';
import type { BookedVisit, MoveVisitInput } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { kickWorker } from '@/server/messages/worker';
import { overriddenWords, writeOverrides } from './book-visit';
import { readJobRecords } from './job-records';
import { lockCrew } from './lock-crew';
import { type LockedVisit, lockVisit, mustBeCurrent } from './lock-visit';
import { mustPassGates, type Plan, planVisit } from './plan-visit';
import { readVisit } from './read-visits';
import { type Attempt, translateTakenTime } from './taken-time';
import { toldWords } from './tell-customer';
import { readStanding } from './visit-standing';
import { mustBeMovable, writeMove } from './write-move';

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

  const stood = await readStanding(tx, ctx, before.id);
  const personIds = crew.people.map(({ id }) => id);
  onPlanned({ visitId: before.id, crewId: crew.id, personIds, pieces: plan.pieces });
  const { after, told } = await writeMove(tx, ctx, { before, crew, plan });
  await writeOverrides(tx, ctx, { visitId: after.id, openGates, reason: input.overrideReason });

  const view = await readVisit(tx, ctx, after.id);
  const where = `${view.dayWords}, ${view.windowWords}, with ${crew.name}`;
  await writeAudit(tx, ctx, {
    verb: 'move-visit',
    subjectKind: 'visit',
    subjectId: after.id,
    jobId: after.jobId,
    summary: `${visitKindWords[after.kind]} moved to ${where}${told ? `; ${toldWords(told)}` : ''}${overriddenWords(openGates, input.overrideReason)}`,
    detail: { before: stood, after: timesOf(after), told, openGates },
  });
  return { ...view, warnings: plan.warnings };
}

/** A gate that was overridden for this visit once is not asked about again. */
export async function notYetOverridden(
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

function timesOf({ crewId, startsAt, endsAt, version }: LockedVisit) {
  return { crewId, startsAt, endsAt, version };
}
