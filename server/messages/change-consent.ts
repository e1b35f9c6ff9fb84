import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { consents, messages } from '@/db/schema';
import type { Channel } from '@/lib/messages/consent';

/** Writes down that a customer allows or refuses a channel; a refusal takes back what waits there. */
export async function changeConsent(
  tx: Transaction,
  said: {
    shopId: string;
    customerId: string;
    channel: Channel;
    given: boolean;
    how: string;
    at: Date;
    byPersonId?: string;
    /** Their words, or where it is written down. */
    proof?: string;
  },
): Promise<void> {
  await tx.insert(consents).values(said);
  if (said.given) return;
  await tx
    .update(messages)
    .set({ state: 'withdrawn', reason: `The customer ${said.how}.` })
    .where(
      and(
        eq(messages.shopId, said.shopId),
        eq(messages.customerId, said.customerId),
        eq(messages.channel, said.channel),
        eq(messages.state, 'waiting'),
      ),
    );
}
