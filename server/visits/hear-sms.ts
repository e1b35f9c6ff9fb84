import type { Database, Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import { type Reply, understandReply } from '@/lib/messages/replies';
import { Refusal } from '@/server/base/problem-response';
import { shopContext } from '@/server/base/shop-context';
import { changeConsent } from '@/server/messages/change-consent';
import type { InboundSms } from '@/server/ports/sms/webhooks';
import { type Answer, applyAnswer } from './apply-answer';
import { findLastTold, findMeantVisit, findSenders } from './sms-sender';

/**
 * A text from a customer, whose signature was checked. The provider's number is one for all shops, so the
 * sender's number is looked for in every shop; each text is kept in one, once, whatever it means.
 */
export async function hearSms(db: Database, sms: InboundSms, now: Date): Promise<void> {
  const senders = await findSenders(db, sms.from);
  if (senders.length === 0) return;
  const lastTold = await findLastTold(db, sms.from);
  const sender =
    senders.find(({ customerId }) => customerId === lastTold?.customerId) ?? senders[0];
  if (!sender) return;
  const reply = understandReply(sms.body);
  const asked = answerOf(reply, sms.body);
  const about = asked ? await findMeantVisit(db, sms.from, { asked, lastTold, now }) : null;
  const keptBeside = about ?? {
    ...sender,
    visitId: lastTold?.visitId ?? null,
    jobId: lastTold?.jobId,
  };

  const keep = (reason: string, act: (tx: Transaction) => Promise<void>) =>
    db.transaction(async (tx) => {
      const kept = await keepText(tx, sms, { ...keptBeside, reason, now });
      if (kept) await act(tx);
    });
  if (reply.meaning === 'stop' || reply.meaning === 'start') {
    const given = reply.meaning === 'start';
    const how = given ? 'texted START' : 'texted STOP';
    await keep(consentWords(reply), async (tx) => {
      for (const { shopId, customerId } of senders) {
        await changeConsent(tx, { shopId, customerId, channel: 'sms', given, how, at: now });
      }
    });
  } else if (about && asked) {
    const ctx = await shopContext(db, {
      shopId: about.shopId,
      actor: { kind: 'customer', ...about },
      now,
    });
    try {
      await keep(
        asked.answer === 'confirm' ? 'Confirmed by this text.' : 'Asks for another time.',
        (tx) => applyAnswer(tx, ctx, asked),
      );
    } catch (error) {
      if (!(error instanceof Refusal)) throw error;
      await keep(`Read it: ${error.message}`, nothing);
    }
  } else {
    await keep(unclearWords(reply), nothing);
  }
}

const nothing = async () => {};

function answerOf({ meaning }: Reply, body: string): Answer | null {
  if (meaning === 'yes') return { answer: 'confirm', words: '' };
  if (meaning === 'no' || meaning === 'change') {
    return { answer: 'another-time', words: body.trim().slice(0, 400) };
  }
  return null;
}

/** False when the provider posts a text for the second time. */
async function keepText(
  tx: Transaction,
  sms: InboundSms,
  about: {
    shopId: string;
    customerId: string;
    visitId: string | null;
    jobId?: string | null;
    reason: string;
    now: Date;
  },
): Promise<boolean> {
  const { shopId, customerId, visitId, jobId, reason, now } = about;
  const kept = await tx
    .insert(messages)
    .values({
      shopId,
      customerId,
      visitId,
      jobId,
      occasion: 'reply',
      channel: 'sms',
      key: `in:${sms.providerId}`,
      state: 'received',
      dueAt: now,
      createdAt: now,
      providerId: sms.providerId,
      body: sms.body,
      reason,
    })
    .onConflictDoNothing({ target: [messages.shopId, messages.key] })
    .returning({ id: messages.id });
  return kept.length > 0;
}

function consentWords({ meaning, mayCallOffVisit }: Reply): string {
  if (meaning === 'start') return 'May be texted again.';
  return mayCallOffVisit
    ? 'No more texts to this number. They may mean the visit as well: call them.'
    : 'No more texts to this number.';
}

function unclearWords({ meaning, mayCallOffVisit }: Reply): string {
  if (mayCallOffVisit) return 'They may mean to call the visit off: call them.';
  if (meaning === 'help') return 'Asks who you are: call them.';
  if (meaning === 'unclear') return 'Read it: it is not clear what is meant.';
  return 'Read it: it is not clear which visit is meant.';
}
