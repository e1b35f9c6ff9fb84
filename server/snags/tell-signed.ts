import type { Transaction } from '@/db/database';
import { channels } from '@/lib/messages/consent';
import type { PersonContext } from '@/server/base/context';
import { enqueue } from '@/server/messages/enqueue';
import { readRecipient } from '@/server/messages/recipient';
import type { LockedVisit } from '@/server/visits/lock-visit';

/** A copy is of use for days: the customer's mailbox may be down over a weekend. */
const usefulDays = 7;

/** The customer is told that it is done, with a copy of what was signed. */
export async function tellSigned(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
): Promise<void> {
  const recipient = await readRecipient(tx, ctx.shop.id, visit.customerId);
  const { id: visitId, jobId, version, zone } = visit;
  const notAfter = new Date(ctx.now.getTime() + usefulDays * 86_400_000);
  await enqueue(
    tx,
    ctx,
    { recipient, about: { visitId, jobId, version, zone } },
    channels.map((channel) => ({ occasion: 'done' as const, channel, dueAt: ctx.now, notAfter })),
  );
}
