import { and, asc, eq, inArray, isNotNull, lte } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';
import { leaseMs } from './claim-due';

const mostAtOnce = 10;

export type Unreported = { id: string; shopId: string; providerId: string; sentAt: Date };

/** Texts that were sent and never reported, of all shops, so that no other worker asks as well. */
export async function claimUnreported(db: Database, now: Date): Promise<Unreported[]> {
  return db.transaction(async (tx) => {
    const late = await tx
      .select({ id: messages.id })
      .from(messages)
      .where(
        and(
          eq(messages.state, 'sent'),
          lte(messages.askAt, now),
          isNotNull(messages.providerId),
          isNotNull(messages.sentAt),
        ),
      )
      .orderBy(asc(messages.askAt), asc(messages.id))
      .limit(mostAtOnce)
      .for('update', { skipLocked: true });
    if (late.length === 0) return [];
    const claimed = await tx
      .update(messages)
      .set({ askAt: new Date(now.getTime() + leaseMs) })
      .where(
        inArray(
          messages.id,
          late.map(({ id }) => id),
        ),
      )
      .returning({
        id: messages.id,
        shopId: messages.shopId,
        providerId: messages.providerId,
        sentAt: messages.sentAt,
      });
    return claimed.flatMap(({ providerId, sentAt, ...row }) =>
      providerId && sentAt ? [{ ...row, providerId, sentAt }] : [],
    );
  });
}
