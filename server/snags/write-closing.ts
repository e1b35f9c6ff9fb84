import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { signOffs, snags, visits } from '@/db/schema';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { lockSnag } from './lock-snag';

type Closing = {
  snagId: string;
  words: string;
  photoIds: string[];
  at: Date;
  /** From a visit: a snag of another job is not there. */
  ofJobId?: string;
};

/**
 * Closes a snag with what shows it; closed twice, the first stands. With the last one of a job whose
 * customer has signed, the job is signed off.
 */
export async function writeClosing(
  tx: Transaction,
  ctx: PersonContext,
  { snagId, words, photoIds, at, ofJobId }: Closing,
): Promise<void> {
  const snag = await lockSnag(tx, ctx, snagId);
  if (ofJobId !== undefined && snag.jobId !== ofJobId) throw notFound('snag');
  if (snag.closedAt) return;
  await tx
    .update(snags)
    .set({
      closedAt: at,
      closedBy: ctx.actor.personId,
      closedWords: words,
      closedPhotoIds: photoIds,
    })
    .where(and(eq(snags.shopId, ctx.shop.id), eq(snags.id, snagId)));
  const { jobId } = snag;
  await writeAudit(tx, ctx, {
    verb: 'close-snag',
    subjectKind: 'snag',
    subjectId: snagId,
    jobId,
    summary: `Snag closed: ${[snag.place, snag.words].filter(Boolean).join(', ')}${words ? ` (${words})` : ''}`,
  });
  const isDone = (await countOpen(tx, ctx, jobId)) === 0 && (await isSigned(tx, ctx, jobId));
  if (isDone) await moveStage(tx, ctx, { jobId, event: 'signed' });
}

/** Snags of a job that are still open. */
export async function countOpen(tx: Transaction, ctx: PersonContext, jobId: string) {
  return tx.$count(
    snags,
    and(eq(snags.shopId, ctx.shop.id), eq(snags.jobId, jobId), isNull(snags.closedAt)),
  );
}

/** Signed for the set cabinets, not for a delivery. */
async function isSigned(tx: Transaction, ctx: PersonContext, jobId: string): Promise<boolean> {
  const signed = await tx
    .select({ kind: visits.kind })
    .from(signOffs)
    .innerJoin(visits, eq(visits.id, signOffs.visitId))
    .where(and(eq(signOffs.shopId, ctx.shop.id), eq(signOffs.jobId, jobId)));
  return signed.some(({ kind }) => kind === 'install' || kind === 'return');
}
