import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs } from '@/db/schema';
import type { AcceptedSlip, AcceptSlipInput } from '@/lib/contracts/slips';
import type { VisitKind } from '@/lib/schedule';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { onlyOnce } from '@/server/base/only-once';
import { notFound } from '@/server/base/problem-response';
import { kickWorker } from '@/server/messages/worker';
import { readJobRecords } from '@/server/visits/job-records';
import { lockCrew } from '@/server/visits/lock-crew';
import { type LockedVisit, lockVisit, mustBeCurrent } from '@/server/visits/lock-visit';
import { notYetOverridden } from '@/server/visits/move-visit';
import { mustPassGates, planVisit } from '@/server/visits/plan-visit';
import { readVisit } from '@/server/visits/read-visits';
import { type Attempt, translateTakenTime } from '@/server/visits/taken-time';
import { toldWords } from '@/server/visits/tell-customer';
import { mustBeMovable, writeMove } from '@/server/visits/write-move';
import { removePieces } from '@/server/visits/write-pieces';

type MoveInput = AcceptSlipInput['moves'][number];

/** What waits for what is moved later. */
const chain: Record<VisitKind, number> = {
  'site-measure': 0,
  'check-measure': 1,
  delivery: 2,
  install: 3,
  'worktop-template': 4,
  return: 5,
};

/** A delay of the shop as the scheduler agreed it: new ready days and all moves, or nothing; each told once. */
export async function acceptSlip(
  ctx: PersonContext,
  input: AcceptSlipInput,
): Promise<AcceptedSlip> {
  mustBeAllowed(ctx, 'visits:book');
  let attempt: Attempt | null = null;
  const accepted = await translateTakenTime(
    ctx,
    () => attempt,
    () =>
      ctx.db.transaction((tx) =>
        onlyOnce(tx, ctx, { verb: 'accept-slip', key: input.idempotencyKey }, () =>
          write(tx, ctx, input, (planned) => {
            attempt = planned;
          }),
        ),
      ),
  );
  kickWorker();
  return accepted;
}

async function write(
  tx: Transaction,
  ctx: PersonContext,
  input: AcceptSlipInput,
  onPlanned: (attempt: Attempt) => void,
): Promise<AcceptedSlip> {
  await putReadyDays(tx, ctx, input);
  const locked: { move: MoveInput; before: LockedVisit }[] = [];
  for (const move of input.moves.toSorted((a, b) => a.visitId.localeCompare(b.visitId))) {
    const before = await lockVisit(tx, ctx, move.visitId);
    if (!input.jobs.some(({ jobId }) => jobId === before.jobId)) throw notFound('visit');
    await mustBeCurrent(tx, ctx, before, move.version);
    mustBeMovable(before);
    locked.push({ move, before });
  }
  for (const crewId of [...new Set(input.moves.map((move) => move.crewId))].sort()) {
    await lockCrew(tx, ctx, crewId);
  }
  // All times are given up before one is taken: one visit may go where another stood.
  for (const { before } of locked) await removePieces(tx, ctx, before.id);
  const told = new Set<string>();
  const inChain = locked.toSorted((a, b) => chain[a.before.kind] - chain[b.before.kind]);
  for (const { move, before } of inChain) {
    const isTold = await moveOne(tx, ctx, { move, before, reason: input.reason, onPlanned });
    if (isTold) told.add(before.customerId);
  }
  return { moved: locked.length, customersTold: told.size };
}

async function putReadyDays(
  tx: Transaction,
  ctx: PersonContext,
  { jobs: late, reason }: AcceptSlipInput,
): Promise<void> {
  const ids = [...new Set(late.map(({ jobId }) => jobId))];
  const found = await tx
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), inArray(jobs.id, ids)))
    .orderBy(asc(jobs.id))
    .for('update');
  if (found.length < ids.length) throw notFound('job');
  for (const { jobId, readyOn } of late) {
    await tx
      .update(jobs)
      .set({ readyOn, readyWhy: reason })
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
    const day = formatLocalDayShort(readyOn, { language: 'en', region: ctx.shop.region });
    await writeAudit(tx, ctx, {
      verb: 'accept-slip',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary: `Cabinets ready ${day} by now: ${reason}`,
    });
  }
}

async function moveOne(
  tx: Transaction,
  ctx: PersonContext,
  work: {
    move: MoveInput;
    before: LockedVisit;
    reason: string;
    onPlanned: (attempt: Attempt) => void;
  },
): Promise<boolean> {
  const { move, before, reason } = work;
  const [job] = await readJobRecords(tx, ctx, eq(jobs.id, before.jobId));
  if (!job) throw notFound('job');
  const crew = await lockCrew(tx, ctx, move.crewId);
  const { kind, workMinutes } = before;
  const { date, time } = move;
  const plan = planVisit(ctx, job, crew, { kind, date, time, workMinutes });
  mustPassGates(await notYetOverridden(tx, ctx, before.id, plan.openGates), '');
  const personIds = crew.people.map(({ id }) => id);
  work.onPlanned({ visitId: before.id, crewId: crew.id, personIds, pieces: plan.pieces });
  const { after, told } = await writeMove(tx, ctx, { before, crew, plan });
  const view = await readVisit(tx, ctx, after.id);
  await writeAudit(tx, ctx, {
    verb: 'accept-slip',
    subjectKind: 'visit',
    subjectId: after.id,
    jobId: after.jobId,
    summary: `${visitKindWords[after.kind]} moved to ${view.dayWords}, ${view.windowWords}, with ${crew.name}, because the shop is late: ${reason}${told ? `; ${toldWords(told)}` : ''}`,
    detail: { told },
  });
  return told !== null && told.length > 0;
}
