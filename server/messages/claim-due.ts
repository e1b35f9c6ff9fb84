import { and, asc, eq, inArray, lte, sql } from 'drizzle-orm';
import type { PgUpdateSetSource } from 'drizzle-orm/pg-core';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';
import { leads, lockThoseWith } from './told-together';

/** Longer than any send can take; after it, whoever held the message is taken for dead. */
export const leaseMs = 120_000;
const mostAtOnce = 10;

/**
 * Takes messages that are due, with those that go with them, so that no other worker does: rows locked by
 * another are passed by. While a message is `sending`, its due time is when its lease ends.
 */
export async function claimDue(db: Database, now: Date): Promise<Claimed[]> {
  return claim(db, now, 'waiting', {
    state: 'sending',
    firstTriedAt: sql`coalesce(${messages.firstTriedAt}, ${now.toISOString()}::timestamptz)`,
    attempts: sql`${messages.attempts} + 1`,
  });
}

/** Takes messages whose worker died over them, or whose answer was lost, to find out what became of them. */
export async function claimUnsettled(db: Database, now: Date): Promise<Claimed[]> {
  return claim(db, now, 'sending', {});
}

async function claim(
  db: Database,
  now: Date,
  state: 'waiting' | 'sending',
  change: PgUpdateSetSource<typeof messages>,
): Promise<Claimed[]> {
  return db.transaction(async (tx) => {
    const due = await tx
      .select({ id: messages.id })
      .from(messages)
      .where(and(eq(messages.state, state), lte(messages.dueAt, now), leads(tx, state)))
      .orderBy(asc(messages.dueAt), asc(messages.id))
      .limit(mostAtOnce)
      .for('update', { skipLocked: true });
    if (due.length === 0) return [];
    const ids = due.map(({ id }) => id);
    const others = await lockThoseWith(tx, ids, state);
    const rows = await tx
      .update(messages)
      .set({
        ...change,
        claimedAt: now,
        dueAt: new Date(now.getTime() + leaseMs),
        // Whom it was to go with has gone, or was withdrawn.
        toldWith: sql`case when ${inArray(messages.id, ids)} then null else ${messages.toldWith} end`,
      })
      .where(inArray(messages.id, [...ids, ...others]))
      .returning(claimedFields);
    return rows
      .filter(({ toldWith }) => toldWith === null)
      .map((row) => ({ ...row, others: rows.filter(({ toldWith }) => toldWith === row.id) }));
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
  toldWith: messages.toldWith,
};
type ClaimedRow = { [Field in keyof typeof claimedFields]: (typeof messages.$inferSelect)[Field] };
/** `others`: what is told in the same message, and shares its fate. */
export type Claimed = ClaimedRow & { others: ClaimedRow[] };
