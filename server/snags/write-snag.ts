import { and, eq, lt } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { rooms, signOffs, snags } from '@/db/schema';
import type { OpenSnagInput } from '@/lib/contracts/snags';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { snagKindWords } from './snag-words';

export type NewSnag = OpenSnagInput & { visitId: string | null; foundAt: Date };

/** Writes a snag down; told twice it is one. One found after the customer signed stands apart. */
export async function writeSnag(tx: Transaction, ctx: PersonContext, snag: NewSnag): Promise<void> {
  const { id, jobId, visitId, roomId, foundAt } = snag;
  if (roomId) await mustBeRoomOf(tx, ctx, { roomId, jobId });
  const [added] = await tx
    .insert(snags)
    .values({
      shopId: ctx.shop.id,
      id,
      jobId,
      visitId,
      roomId,
      unitId: snag.unitId,
      place: snag.place,
      kind: snag.kind,
      words: snag.words,
      mender: snag.mender,
      dueOn: snag.dueOn,
      photoIds: snag.photoIds,
      foundAt,
      foundBy: ctx.actor.personId,
      isAfterSignOff: await wasSignedBefore(tx, ctx, jobId, foundAt),
    })
    .onConflictDoNothing({ target: snags.id })
    .returning({ id: snags.id });
  if (!added) return mustBeSame(tx, ctx, snag);
  await moveStage(tx, ctx, { jobId, event: 'snag-opened' });
  await writeAudit(tx, ctx, {
    verb: 'open-snag',
    subjectKind: 'snag',
    subjectId: id,
    jobId,
    summary: `${snagKindWords[snag.kind]}: ${[snag.place, snag.words].filter(Boolean).join(', ')}`,
    detail: { mender: snag.mender, dueOn: snag.dueOn },
  });
}

async function mustBeRoomOf(
  tx: Transaction,
  ctx: PersonContext,
  of: { roomId: string; jobId: string },
): Promise<void> {
  const [room] = await tx
    .select({ id: rooms.id })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, of.roomId), eq(rooms.jobId, of.jobId)));
  if (!room) throw notFound('room');
}

async function wasSignedBefore(
  tx: Transaction,
  ctx: PersonContext,
  jobId: string,
  at: Date,
): Promise<boolean> {
  const [signed] = await tx
    .select({ id: signOffs.id })
    .from(signOffs)
    .where(
      and(eq(signOffs.shopId, ctx.shop.id), eq(signOffs.jobId, jobId), lt(signOffs.signedAt, at)),
    )
    .limit(1);
  return signed !== undefined;
}

async function mustBeSame(tx: Transaction, ctx: PersonContext, snag: NewSnag): Promise<void> {
  const [known] = await tx
    .select({ jobId: snags.jobId })
    .from(snags)
    .where(and(eq(snags.shopId, ctx.shop.id), eq(snags.id, snag.id)));
  if (known?.jobId === snag.jobId) return;
  throw new Refusal({
    status: 409,
    code: 'id-taken',
    message: 'Another snag has this id already. It was not changed; write this one again.',
  });
}
