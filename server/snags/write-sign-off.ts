import { and, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { signOffs, snags } from '@/db/schema';
import type { DayEventOf } from '@/lib/contracts/day-events';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import { Refusal, type RefusalDetail } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { lockVisit } from '@/server/visits/lock-visit';
import { signOffSeal } from './sign-off-seal';
import { tellSigned } from './tell-signed';
import { countOpen } from './write-closing';

/**
 * Keeps what the customer signed as it stood on the glass, under a seal. Sent twice it is one; a visit is
 * signed once. The customer gets a copy, told in the same transaction.
 */
export async function writeSignOff(
  tx: Transaction,
  ctx: PersonContext,
  event: DayEventOf<'sign-off'>,
  signedAt: Date,
): Promise<void> {
  const visit = await lockVisit(tx, ctx, event.visitId);
  const { jobId } = visit;
  if (await isKnown(tx, ctx, event)) return;
  await mustKnowSnags(tx, ctx, { jobId, ids: event.snags.map(({ id }) => id) });
  const parts = {
    shopId: ctx.shop.id,
    id: event.id,
    jobId,
    visitId: visit.id,
    name: event.name,
    language: event.language,
    statement: event.statement,
    strokes: event.strokes,
    snags: event.snags,
    signedAt,
    takenBy: ctx.actor.personId,
    receivedAt: ctx.now,
  };
  await translateRefusals({ sign_offs_one_per_visit: signedAlready, sign_offs_pkey: idTaken }, () =>
    tx.insert(signOffs).values({ ...parts, seal: signOffSeal(parts) }),
  );
  const open = await countOpen(tx, ctx, jobId);
  if (visit.kind === 'install' || visit.kind === 'return') {
    await moveStage(tx, ctx, { jobId, event: open === 0 ? 'signed' : 'snag-opened' });
  }
  await writeAudit(tx, ctx, {
    verb: 'sign-off',
    subjectKind: 'sign-off',
    subjectId: event.id,
    jobId,
    summary: `Signed by ${event.name}, ${openWords(event.snags.length)}`,
    detail: { visitId: visit.id, signedAt: signedAt.toISOString() },
  });
  await tellSigned(tx, ctx, visit);
}

function openWords(count: number): string {
  if (count === 0) return 'no snag open';
  return count === 1 ? '1 snag open' : `${count} snags open`;
}

async function isKnown(
  tx: Transaction,
  ctx: PersonContext,
  event: DayEventOf<'sign-off'>,
): Promise<boolean> {
  const [known] = await tx
    .select({ id: signOffs.id })
    .from(signOffs)
    .where(and(eq(signOffs.shopId, ctx.shop.id), eq(signOffs.visitId, event.visitId)));
  if (!known) return false;
  if (known.id !== event.id) throw new Refusal(signedAlready());
  return true;
}

/** What was shown to the customer must be snags of this job; one that is still on the phone comes first. */
async function mustKnowSnags(
  tx: Transaction,
  ctx: PersonContext,
  { jobId, ids }: { jobId: string; ids: string[] },
): Promise<void> {
  if (ids.length === 0) return;
  const known = await tx
    .select({ id: snags.id })
    .from(snags)
    .where(and(eq(snags.shopId, ctx.shop.id), eq(snags.jobId, jobId), inArray(snags.id, ids)));
  if (known.length === new Set(ids).size) return;
  throw new Refusal({
    status: 422,
    code: 'snag-unknown',
    message: 'A snag on the signed list is not with the office. Send the snags first, then this.',
  });
}

const signedAlready = (): RefusalDetail => ({
  status: 409,
  code: 'signed-already',
  message: 'This visit is signed already. That signature stands; this one was not taken.',
});

const idTaken = (): RefusalDetail => ({
  status: 409,
  code: 'id-taken',
  message: 'Another record has this id already. It was not changed; sign again.',
});
