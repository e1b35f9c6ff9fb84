import { and, eq, inArray, like } from 'drizzle-orm';
import { z } from 'zod';
import type { Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { TakenBackVisit, UndoVisitChangeInput } from '@/lib/contracts/visit-changes';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { reopenItems } from '@/server/messages/scheduler-items';
import { kickWorker } from '@/server/messages/worker';
import { holdAgain } from './hold-again';
import { readLastChange } from './last-change';
import { lockCrew } from './lock-crew';
import { changeVisit, type LockedVisit, lockVisit, mustBeCurrent } from './lock-visit';
import { readVisit } from './read-visits';
import { type Attempt, translateTakenTime } from './taken-time';
import { tellCalledOff, tellMoved, tellStandsAgain, toldWords } from './tell-customer';
import { keepVisitLink } from './visit-link';
import { readStanding, type VisitStanding, visitStanding } from './visit-standing';
import { removePieces, writePieces } from './write-pieces';

/** Undo stands on the screen for ten seconds, and as long as a hand rests on it. */
const undoWithinMs = 120_000;

/**
 * Takes back what the same person did to a visit just now: a booking, a move, a calling off, a yes that was
 * noted, the taking of a held time, which is held again. The visit stands as it stood, a yes of the customer included; what had not
 * gone out yet never goes out.
 */
export async function undoVisitChange(
  ctx: PersonContext,
  input: UndoVisitChangeInput,
): Promise<TakenBackVisit> {
  mustBeAllowed(ctx, 'visits:book');
  let attempt: Attempt | null = null;
  const view = await translateTakenTime(
    ctx,
    () => attempt,
    () =>
      ctx.db.transaction(async (tx) => {
        const visit = await lockVisit(tx, ctx, input.visitId);
        await mustBeCurrent(tx, ctx, visit, input.version);
        const change = await undoableChange(tx, ctx, visit);
        const stood = await readStanding(tx, ctx, visit.id);
        const told = await takeBack(tx, ctx, visit, change, (planned) => {
          attempt = planned;
        });
        const isHeldAgain = await holdOnceMore(tx, ctx, { visit, stood, change });
        const after = await readVisit(tx, ctx, visit.id);
        const where =
          change.what === 'book'
            ? 'it waits to be booked again'
            : `it stands again on ${after.dayWords}, ${after.windowWords}, with ${after.crewName}`;
        await writeAudit(tx, ctx, {
          verb: 'undo-visit-change',
          subjectKind: 'visit',
          subjectId: visit.id,
          jobId: visit.jobId,
          summary: `${visitKindWords[visit.kind]}: the last change is taken back, ${where}${isHeldAgain ? ', the other time is held as before' : ''}${told.length > 0 ? `; ${toldWords(told)}` : ''}`,
        });
        return { ...after, isHeldAgain };
      }),
  );
  kickWorker();
  return view;
}

/** `holdEndsAt`: it came of the taking of a held time. */
type Change = { holdEndsAt: Date | null } & (
  | { what: 'book' }
  | { what: 'move' | 'call-off' | 'yes'; before: VisitStanding }
);

const takenHold = z.object({ holdEndsAt: z.coerce.date() });

async function undoableChange(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
): Promise<Change> {
  const line = await readLastChange(tx, ctx, visit.id);
  const isMine = line?.by === ctx.actor.name;
  const isRecent = line !== null && ctx.now.getTime() - line.at.getTime() <= undoWithinMs;
  if (!isMine || !isRecent) throw tooLate();
  const holdEndsAt = takenHold.safeParse(line.detail).data?.holdEndsAt ?? null;
  if (line.verb === 'book-visit') return { what: 'book', holdEndsAt };
  const { data: before } = visitStanding.safeParse(line.detail.before);
  if (line.verb === 'take-held-time' && holdEndsAt) {
    return before ? { what: 'move', before, holdEndsAt } : { what: 'book', holdEndsAt };
  }
  if (before && line.verb === 'move-visit') return { what: 'move', before, holdEndsAt };
  if (before && line.verb === 'call-off-visit') return { what: 'call-off', before, holdEndsAt };
  if (before && line.verb === 'note-yes') return { what: 'yes', before, holdEndsAt };
  throw tooLate();
}

async function holdOnceMore(
  tx: Transaction,
  ctx: PersonContext,
  { visit, stood, change }: { visit: LockedVisit; stood: VisitStanding; change: Change },
): Promise<boolean> {
  const { holdEndsAt } = change;
  if (!holdEndsAt) return false;
  const { jobId, kind } = visit;
  const forVisitId = change.what === 'book' ? null : visit.id;
  return holdAgain(tx, ctx, { jobId, kind, stood, holdEndsAt, forVisitId });
}

async function takeBack(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
  change: Change,
  onPlanned: (attempt: Attempt) => void,
) {
  switch (change.what) {
    case 'book':
      return takeBooking(tx, ctx, visit);
    case 'yes':
      return takeYes(tx, ctx, visit, change.before);
    default:
      return putBack(tx, ctx, visit, { what: change.what, before: change.before }, onPlanned);
  }
}

/** Nobody was told of it, so nobody is told that it is gone; what it had settled waits again. */
async function takeYes(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
  { status, confirmedAt, customerSays }: VisitStanding,
) {
  if (visit.confirmedAt) await reopenItems(tx, ctx, { visitId: visit.id, at: visit.confirmedAt });
  await changeVisit(tx, ctx, visit, { status, confirmedAt, customerSays });
  return [];
}

async function takeBooking(tx: Transaction, ctx: PersonContext, visit: LockedVisit) {
  const after = await changeVisit(tx, ctx, visit, { status: 'called-off', confirmedAt: null });
  await removePieces(tx, ctx, after.id);
  return tellCalledOff(tx, ctx, after, 'It was booked by mistake.');
}

async function putBack(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
  { what, before }: { what: 'move' | 'call-off'; before: VisitStanding },
  onPlanned: (attempt: Attempt) => void,
) {
  const { version: _, pieces, ...stood } = before;
  // Who has heard of the change has to say yes again.
  const again = (await isHeardOf(tx, ctx, visit))
    ? ({ status: 'booked', confirmedAt: null } as const)
    : {};
  const after = await changeVisit(tx, ctx, visit, { ...stood, ...again });
  const crew = await lockCrew(tx, ctx, before.crewId);
  const personIds = crew.people.map(({ id }) => id);
  onPlanned({ visitId: visit.id, crewId: crew.id, personIds, pieces });
  await writePieces(tx, ctx, { visitId: visit.id, crew, pieces });
  await keepVisitLink(tx, ctx, { visitId: visit.id, endsAt: after.endsAt });
  return what === 'move' ? tellMoved(tx, ctx, after, visit) : tellStandsAgain(tx, ctx, after);
}

/** Whether anything of this version has left the shop, or is leaving it. */
async function isHeardOf(tx: Transaction, ctx: PersonContext, visit: LockedVisit) {
  const [sent] = await tx
    .select({ id: messages.id })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, ctx.shop.id),
        like(messages.key, `${visit.id}:${visit.version}:%`),
        inArray(messages.state, ['sending', 'sent', 'delivered']),
      ),
    )
    .limit(1);
  return sent !== undefined;
}

function tooLate(): Refusal {
  return new Refusal({
    status: 409,
    code: 'too-late-to-undo',
    message: 'Nothing was changed: it is too late to take that back. Move the visit instead.',
  });
}
