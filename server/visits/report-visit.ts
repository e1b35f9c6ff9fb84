import { and, asc, eq, gte, ne } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { crewPeople, visitPiecePeople, visitPieces } from '@/db/schema';
import type { ReportVisitInput, VisitView } from '@/lib/contracts/visits';
import { type ProgressTap, progressRank, statusAfter } from '@/lib/days/visit-progress';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { kickWorker } from '@/server/messages/worker';
import { changeVisit, type LockedVisit, lockVisit } from './lock-visit';
import { readVisit } from './read-visits';
import { runLate } from './run-late';
import { tellTap } from './tell-tap';

const words: Record<ProgressTap, string> = {
  'on-the-way': 'on the way',
  arrived: 'arrived',
  done: 'done',
  'nobody-home': 'nobody home',
};
/** One tap on site. Sent twice, or late from a phone without signal, it does no harm. */
export async function reportVisit(ctx: PersonContext, input: ReportVisitInput): Promise<VisitView> {
  mustBeAllowed(ctx, 'visits:report');
  const view = await ctx.db.transaction(async (tx) => {
    const before = await lockVisit(tx, ctx, input.visitId);
    await mustBeOwnVisit(tx, ctx, before);
    if (before.status === 'called-off') throw calledOff(await readVisit(tx, ctx, before.id));
    if (input.what === 'running-late') await runLate(tx, ctx, before, input.lateMinutes ?? 0);
    else await goOn(tx, ctx, before, { what: input.what, at: tappedAt(ctx, input) });
    return readVisit(tx, ctx, before.id);
  });
  kickWorker();
  return view;
}

/** A phone's clock may be ahead of ours. */
function tappedAt(ctx: PersonContext, { at }: ReportVisitInput): Date {
  return new Date(Math.min(new Date(at).getTime(), ctx.now.getTime()));
}

async function goOn(
  tx: Transaction,
  ctx: PersonContext,
  before: LockedVisit,
  { what, at }: { what: ProgressTap; at: Date },
): Promise<void> {
  const status = statusAfter[what];
  if (progressRank[status] <= progressRank[before.status]) return;
  const after = await changeVisit(tx, ctx, before, {
    status,
    ...(what === 'arrived' ? { arrivedAt: at } : {}),
    ...(progressRank[status] === 3 ? { leftAt: at } : {}),
  });
  if (progressRank[status] === 3) await freeTimeAfter(tx, ctx, after.id, at);
  if (what === 'arrived' && after.kind === 'install') {
    await moveStage(tx, ctx, { jobId: after.jobId, event: 'arrived-for-install' });
  }
  await tellTap(tx, ctx, after, { what, at });
  await writeAudit(tx, ctx, {
    verb: 'report-visit',
    subjectKind: 'visit',
    subjectId: after.id,
    jobId: after.jobId,
    summary: `${visitKindWords[after.kind]}: ${words[what]}`,
    detail: { what, at },
  });
}

/** Fitters and measurers see the visits of their own crews; the office sees all. */
async function mustBeOwnVisit(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
): Promise<void> {
  const { role, personId } = ctx.actor;
  if (role === 'owner' || role === 'scheduler') return;
  const [own] = await tx
    .select({ crewId: crewPeople.crewId })
    .from(crewPeople)
    .where(
      and(
        eq(crewPeople.shopId, ctx.shop.id),
        eq(crewPeople.crewId, visit.crewId),
        eq(crewPeople.personId, personId),
      ),
    );
  if (!own) throw notFound('visit');
}

/** Who leaves early can be booked elsewhere: the days not begun are given back, and the rest of this one. */
async function freeTimeAfter(
  tx: Transaction,
  ctx: PersonContext,
  visitId: string,
  at: Date,
): Promise<void> {
  const ofVisit = and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, visitId));
  const pieces = await tx
    .select({ id: visitPieces.id, startsAt: visitPieces.startsAt, endsAt: visitPieces.endsAt })
    .from(visitPieces)
    .where(ofVisit)
    .orderBy(asc(visitPieces.startsAt));
  const [first] = pieces;
  if (!first) return;
  await tx
    .delete(visitPieces)
    .where(and(ofVisit, ne(visitPieces.id, first.id), gte(visitPieces.startsAt, at)));
  const begun = pieces.find(({ startsAt, endsAt }) => startsAt < at && at < endsAt);
  if (!begun) return;
  await tx
    .update(visitPieces)
    .set({ endsAt: at })
    .where(and(ofVisit, eq(visitPieces.id, begun.id)));
  await tx
    .update(visitPiecePeople)
    .set({ endsAt: at })
    .where(and(eq(visitPiecePeople.shopId, ctx.shop.id), eq(visitPiecePeople.pieceId, begun.id)));
}

function calledOff(current: VisitView): Refusal {
  return new Refusal({
    status: 409,
    code: 'visit-called-off',
    message: 'This visit was called off. Ring the office before you go on.',
    current,
  });
}
