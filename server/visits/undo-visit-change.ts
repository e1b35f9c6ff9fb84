import { and, eq, inArray, like } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { UndoVisitChangeInput } from '@/lib/contracts/visit-changes';
import type { VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { kickWorker } from '@/server/messages/worker';
import { readLastChange } from './last-change';
import { lockCrew } from './lock-crew';
import { changeVisit, type LockedVisit, lockVisit, mustBeCurrent } from './lock-visit';
import { readVisit } from './read-visits';
import { type Attempt, translateTakenTime } from './taken-time';
import { tellCalledOff, tellMoved, tellStandsAgain, toldWords } from './tell-customer';
import { keepVisitLink } from './visit-link';
import { type VisitStanding, visitStanding } from './visit-standing';
import { removePieces, writePieces } from './write-pieces';

/** Undo stands on the screen for ten seconds, and as long as a hand rests on it. */
const undoWithinMs = 120_000;

/**
 * Takes back what the same person did to a visit just now: a booking, a move, a calling off. The visit
 * stands as it stood, a yes of the customer included; what had not gone out yet never goes out.
 */
export async function undoVisitChange(
  ctx: PersonContext,
  input: UndoVisitChangeInput,
): Promise<VisitView> {
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
        const told =
          change.what === 'book'
            ? await takeBooking(tx, ctx, visit)
            : await putBack(tx, ctx, visit, change, (planned) => {
                attempt = planned;
              });
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
          summary: `${visitKindWords[visit.kind]}: the last change is taken back, ${where}${told.length > 0 ? `; ${toldWords(told)}` : ''}`,
        });
        return after;
      }),
  );
  kickWorker();
  return view;
}

type Change = { what: 'book' } | { what: 'move' | 'call-off'; before: VisitStanding };

async function undoableChange(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
): Promise<Change> {
  const line = await readLastChange(tx, ctx, visit.id);
  const isMine = line?.by === ctx.actor.name;
  const isRecent = line !== null && ctx.now.getTime() - line.at.getTime() <= undoWithinMs;
  if (!isMine || !isRecent) throw tooLate();
  if (line.verb === 'book-visit') return { what: 'book' };
  const before = visitStanding.safeParse(line.detail.before);
  if (!before.success) throw tooLate();
  if (line.verb === 'move-visit') return { what: 'move', before: before.data };
  if (line.verb === 'call-off-visit') return { what: 'call-off', before: before.data };
  throw tooLate();
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
