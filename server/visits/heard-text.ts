/** A text from a customer on its way through our ears. */
import type { Database, Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { SchedulerItemKind } from '@/lib/contracts/messages';
import type { NewItem } from '@/server/messages/scheduler-items';
import type { InboundSms } from '@/server/ports/sms/webhooks';
import type { LastTold, Sender } from './sms-sender';

export type Heard = {
  db: Database;
  sms: InboundSms;
  now: Date;
  /** Every customer with this number, in whatever shop. */
  senders: Sender[];
  /** Beside whom the text is kept. */
  sender: Sender;
  lastTold: LastTold | undefined;
};

type Beside = { shopId: string; customerId: string; visitId: string | null; jobId: string | null };

/** Beside the visit that was told last, where it is one of this sender's. */
function besideOf({ sender, lastTold }: Heard): Beside {
  const { shopId, customerId } = sender;
  const isTheirs = lastTold?.customerId === customerId;
  return {
    shopId,
    customerId,
    visitId: (isTheirs && lastTold.visitId) || null,
    jobId: (isTheirs && lastTold.jobId) || null,
  };
}

/** Keeps the text; false when the provider posts it for the second time. */
export async function keepText(
  tx: Transaction,
  heard: Heard,
  kept: { reason: string; beside?: Beside },
): Promise<boolean> {
  const { sms, now } = heard;
  const rows = await tx
    .insert(messages)
    .values({
      ...(kept.beside ?? besideOf(heard)),
      occasion: 'reply',
      channel: 'sms',
      key: `in:${sms.providerId}`,
      state: 'received',
      dueAt: now,
      createdAt: now,
      providerId: sms.providerId,
      body: sms.body,
      reason: kept.reason,
    })
    .onConflictDoNothing({ target: [messages.shopId, messages.key] })
    .returning({ id: messages.id });
  return rows.length > 0;
}

export function itemOf(heard: Heard, kind: SchedulerItemKind, words: string): NewItem {
  const key = `in:${heard.sms.providerId}`;
  return { ...besideOf(heard), kind, key, words, at: heard.now };
}
