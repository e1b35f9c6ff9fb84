import { and, asc, eq, inArray, lte, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';

/** Longer than any send can take; after it, whoever held the message is taken for dead. */
export const leaseMs = 120_000;
const mostAtOnce = 10;

/**
 * Takes messages that are due, so that no other worker does: rows locked by another are passed by. While a
 * message is `sending`, its due time is when its lease ends.
 */
export async function claimDue(db: Database, now: Date) {
  return db.transaction(async (tx) => {
    const due = await tx
      .select({ id: messages.id })
      .from(messages)
      .where(and(eq(messages.state, 'waiting'), lte(messages.dueAt, now)))
      .orderBy(asc(messages.dueAt), asc(messages.id))
      .limit(mostAtOnce)
      .for('update', { skipLocked: true });
    if (due.length === 0) return [];
    return tx
      .update(messages)
      .set({
        state: 'sending',
        claimedAt: now,
        firstTriedAt: sql`coalesce(${messages.firstTriedAt}, ${now.toISOString()}::timestamptz)`,
        dueAt: new Date(now.getTime() + leaseMs),
        attempts: sql`${messages.attempts} + 1`,
      })
      .where(
        inArray(
          messages.id,
          due.map(({ id }) => id),
        ),
      )
      .returning(claimedFields);
  });
}

/** Takes messages whose worker died over them, or whose answer was lost, to find out what became of them. */
export async function claimUnsettled(db: Database, now: Date) {
  return db.transaction(async (tx) => {
    const lapsed = await tx
      .select({ id: messages.id })
      .from(messages)
      .where(and(eq(messages.state, 'sending'), lte(messages.dueAt, now)))
      .orderBy(asc(messages.dueAt), asc(messages.id))
      .limit(mostAtOnce)
      .for('update', { skipLocked: true });
    if (lapsed.length === 0) return [];
    return tx
      .update(messages)
      .set({ claimedAt: now, dueAt: new Date(now.getTime() + leaseMs) })
      .where(
        inArray(
          messages.id,
          lapsed.map(({ id }) => id),
        ),
      )
      .returning(claimedFields);
  });
}

const claimedFields = {
  id: messages.id,
  shopId: messages.shopId,
  customerId: messages.customerId,
  jobId: messages.jobId,
  visitId: messages.visitId,
  occasion: messages.occasion,
  channel: messages.channel,
  cause: messages.cause,
  attempts: messages.attempts,
  notAfter: messages.notAfter,
  createdAt: messages.createdAt,
  claimedAt: messages.claimedAt,
  firstTriedAt: messages.firstTriedAt,
  toAddress: messages.toAddress,
  body: messages.body,
};
export type Claimed = Awaited<ReturnType<typeof claimDue>>[number];
