import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { visitPieces, visits } from '@/db/schema';
import type { HeldVisitInput } from '@/lib/contracts/openings';
import type { VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { type Context, mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { kickWorker } from '@/server/messages/worker';
import { lockCrew } from './lock-crew';
import { changeVisit, type LockedVisit, lockVisit } from './lock-visit';
import { readVisit } from './read-visits';
import { tellBooked, toldWords } from './tell-customer';
import { makeVisitLink } from './visit-link';
import { readStanding } from './visit-standing';
import { mustBeMovable, writeMove } from './write-move';

/** The office takes a held time: it is booked, or the booked visit moves there, and the customer is told. */
export async function takeHeldTime(ctx: PersonContext, input: HeldVisitInput): Promise<VisitView> {
  mustBeAllowed(ctx, 'visits:book');
  const view = await ctx.db.transaction(async (tx) => {
    const held = await lockHeld(tx, ctx, input.visitId);
    return held.heldForVisitId
      ? moveToHeld(tx, ctx, held, held.heldForVisitId)
      : bookHeld(tx, ctx, held);
  });
  kickWorker();
  return view;
}

/** The held visit; one whose time is over is gone, and so is one that was let go. */
export async function lockHeld(
  tx: Transaction,
  ctx: Context,
  visitId: string,
): Promise<LockedVisit> {
  const held = await lockVisit(tx, ctx, visitId).catch((error) => {
    throw error instanceof Refusal ? holdIsOver() : error;
  });
  if (held.status !== 'held') throw holdIsOver();
  return held;
}

export function holdIsOver(): Refusal {
  return new Refusal({
    status: 409,
    code: 'hold-over',
    message: 'Nothing was changed: this time is not held any more. Ask for times again.',
  });
}

/** The booked visit takes the held time, and the hold is gone: all of it or nothing. */
export async function moveToHeld(
  tx: Transaction,
  ctx: Context,
  held: LockedVisit,
  visitId: string,
): Promise<VisitView> {
  const before = await lockVisit(tx, ctx, visitId);
  mustBeMovable(before);
  const stood = await readStanding(tx, ctx, before.id);
  const crew = await lockCrew(tx, ctx, held.crewId);
  const pieces = await tx
    .select({ startsAt: visitPieces.startsAt, endsAt: visitPieces.endsAt })
    .from(visitPieces)
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, held.id)))
    .orderBy(visitPieces.startsAt);
  // The hold gives its time up first: the database would refuse the visit beside it.
  await tx.delete(visits).where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, held.id)));
  const { startsAt, endsAt, windowStartsAt, windowEndsAt, workMinutes } = held;
  const times = { startsAt, endsAt, windowStartsAt, windowEndsAt, workMinutes };
  const plan = { ...times, pieces, openGates: [], warnings: [] };
  const { after, told } = await writeMove(tx, ctx, { before, crew, plan });
  const view = await readVisit(tx, ctx, after.id);
  await writeAudit(tx, ctx, {
    verb: 'take-held-time',
    subjectKind: 'visit',
    subjectId: after.id,
    jobId: after.jobId,
    summary: `${visitKindWords[after.kind]} moved to the held time, ${view.dayWords}, ${view.windowWords}, with ${crew.name}${told ? `; ${toldWords(told)}` : ''}`,
    detail: { before: stood, told, holdEndsAt: held.holdEndsAt },
  });
  return view;
}

async function bookHeld(
  tx: Transaction,
  ctx: PersonContext,
  held: LockedVisit,
): Promise<VisitView> {
  const visit = await changeVisit(tx, ctx, held, { status: 'booked', holdEndsAt: null });
  if (visit.kind === 'site-measure') {
    await moveStage(tx, ctx, { jobId: visit.jobId, event: 'measure-booked' });
  }
  await makeVisitLink(tx, ctx, { visitId: visit.id, endsAt: visit.endsAt });
  const told = await tellBooked(tx, ctx, visit);
  const view = await readVisit(tx, ctx, visit.id);
  await writeAudit(tx, ctx, {
    verb: 'take-held-time',
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId: visit.jobId,
    summary: `${visitKindWords[visit.kind]} booked for ${view.dayWords}, ${view.windowWords}, with ${view.crewName}; ${toldWords(told)}`,
    detail: { told, holdEndsAt: held.holdEndsAt },
  });
  return view;
}
