/** Moves of several visits of one customer are told in one message: one of them leads, the others go with it. */
import { and, asc, eq, exists, inArray, isNull, not, or, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Database, Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { Channel } from '@/lib/messages/consent';

const lead = alias(messages, 'lead');

/** Goes out by itself: it was put with no other, or with one that is not in this state (any more). */
export function leads(db: Database, state: 'waiting' | 'sending') {
  const goesWithOne = db
    .select({ id: lead.id })
    .from(lead)
    .where(
      and(eq(lead.shopId, messages.shopId), eq(lead.id, messages.toldWith), eq(lead.state, state)),
    );
  return or(isNull(messages.toldWith), not(exists(goesWithOne)));
}

/**
 * The move of another visit that the same customer has not been told yet, if there is one: both are told
 * together, and no sooner than the later of the two. One that is just being sent is passed by.
 */
export async function findMoveToJoin(
  tx: Transaction,
  move: { shopId: string; customerId: string; channel: Channel; dueAt: Date },
): Promise<string | null> {
  const [found] = await tx
    .select({ id: messages.id })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, move.shopId),
        eq(messages.customerId, move.customerId),
        eq(messages.channel, move.channel),
        eq(messages.occasion, 'moved'),
        eq(messages.state, 'waiting'),
        // Tried before, a copy of it may have arrived: what is added now would not be read.
        eq(messages.attempts, 0),
        leads(tx, 'waiting'),
      ),
    )
    .orderBy(asc(messages.createdAt), asc(messages.id))
    .limit(1)
    .for('update', { skipLocked: true });
  if (!found) return null;
  await tx
    .update(messages)
    .set({ dueAt: sql`greatest(${messages.dueAt}, ${move.dueAt.toISOString()}::timestamptz)` })
    .where(and(eq(messages.shopId, move.shopId), eq(messages.id, found.id)));
  return found.id;
}

/** Those that go with the given ones; one that somebody else is changing just now is passed by. */
export async function lockThoseWith(
  tx: Transaction,
  leadIds: string[],
  state: 'waiting' | 'sending',
): Promise<string[]> {
  const found = await tx
    .select({ id: messages.id })
    .from(messages)
    .where(and(inArray(messages.toldWith, leadIds), eq(messages.state, state)))
    .for('update', { skipLocked: true });
  return found.map(({ id }) => id);
}
