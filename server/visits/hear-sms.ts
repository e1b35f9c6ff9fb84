import { and, asc, desc, eq, exists, gt, inArray } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/database';
import { customers, jobs, messages, visits } from '@/db/schema';
import { type Reply, understandReply } from '@/lib/messages/replies';
import { Refusal } from '@/server/base/problem-response';
import { shopContext } from '@/server/base/shop-context';
import { changeConsent } from '@/server/messages/change-consent';
import type { InboundSms } from '@/server/ports/sms/webhooks';
import { type Answer, applyAnswer } from './apply-answer';

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

type Sender = { shopId: string; customerId: string; name: string };
type LastTold = {
  customerId: string;
  visitId: string | null;
  jobId: string | null;
  occasion: string;
};
type Meant = Sender & { visitId: string; jobId: string };

function findSenders(db: Database, phone: string): Promise<Sender[]> {
  return db
    .select({ shopId: customers.shopId, customerId: customers.id, name: customers.name })
    .from(customers)
    .where(eq(customers.phone, phone))
    .orderBy(desc(customers.createdAt), asc(customers.id));
}

/** The text that they have last on their phone is what they most likely answer. */
async function findLastTold(db: Database, phone: string): Promise<LastTold | undefined> {
  const [last] = await db
    .select({
      customerId: messages.customerId,
      visitId: messages.visitId,
      jobId: messages.jobId,
      occasion: messages.occasion,
    })
    .from(messages)
    .where(
      and(
        eq(messages.toAddress, phone),
        eq(messages.channel, 'sms'),
        inArray(messages.state, ['sent', 'delivered']),
      ),
    )
    .orderBy(desc(messages.sentAt), desc(messages.id))
    .limit(1);
  return last;
}

function answerOf({ meaning }: Reply, body: string): Answer | null {
  if (meaning === 'yes') return { answer: 'confirm', words: '' };
  if (meaning === 'no' || meaning === 'change') {
    return { answer: 'another-time', words: body.trim().slice(0, 400) };
  }
  return null;
}

/** The one visit that the answer can be about; null when none or several are, and no text asked about one. */
async function findMeantVisit(
  db: Database,
  phone: string,
  known: { asked: Answer; lastTold: LastTold | undefined; now: Date },
): Promise<Meant | null> {
  const { asked, lastTold, now } = known;
  const open =
    asked.answer === 'confirm' ? ['booked' as const] : ['booked' as const, 'confirmed' as const];
  const wasTold = db
    .select({ id: messages.id })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, visits.shopId),
        eq(messages.visitId, visits.id),
        eq(messages.toAddress, phone),
        inArray(messages.state, ['sent', 'delivered']),
      ),
    );
  const found = await db
    .select({
      shopId: visits.shopId,
      customerId: customers.id,
      name: customers.name,
      visitId: visits.id,
      jobId: visits.jobId,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(customers.phone, phone),
        inArray(visits.status, open),
        gt(visits.startsAt, now),
        exists(wasTold),
      ),
    )
    .orderBy(asc(visits.startsAt));
  if (found.length === 1) return found[0] ?? null;
  if (lastTold?.occasion !== 'please-confirm') return null;
  return found.find(({ visitId }) => visitId === lastTold.visitId) ?? null;
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
