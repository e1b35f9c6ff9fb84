import type { Transaction } from '@/db/database';
import type { CustomerContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { shopContext } from '@/server/base/shop-context';
import { putItem } from '@/server/messages/scheduler-items';
import { kickWorker } from '@/server/messages/worker';
import { type Answer, applyAnswer } from './apply-answer';
import { type Heard, itemOf, keepText } from './heard-text';
import { lockVisit } from './lock-visit';
import type { Meant } from './sms-sender';
import { answerText } from './tell-answers';

/** Yes, or another time, about the one visit that is meant. */
export async function hearAnswer(heard: Heard, meant: Meant, asked: Answer): Promise<void> {
  const { db, sms } = heard;
  const ctx = await customerOf(heard, meant);
  const beside = { ...meant };
  try {
    await db.transaction(async (tx) => {
      const isYes = asked.answer === 'confirm';
      const reason = isYes ? 'Confirmed by this text.' : 'Asks for another time.';
      if (!(await keepText(tx, heard, { reason, beside }))) return;
      const visit = await applyAnswer(tx, ctx, asked);
      const inboundId = sms.providerId;
      if (!isYes) await answerText(tx, ctx, visit, { occasion: 'other-time', inboundId });
    });
    kickWorker();
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const reason = `Read it: ${error.message}`;
    await db.transaction((tx) => keepForPerson(tx, heard, { reason, beside }));
  }
}

/** Two or more visits wait for the answer: asked once which is meant, in numbers. */
export async function hearWhich(heard: Heard, open: Meant[], asked: Answer): Promise<void> {
  const [first] = open;
  if (!first) return;
  const ctx = await customerOf(heard, first);
  await heard.db.transaction(async (tx) => {
    const kept = await keepText(tx, heard, {
      reason: 'Two visits wait for an answer: asked which is meant.',
    });
    if (!kept) return;
    const visit = await lockVisit(tx, ctx, first.visitId);
    const isAsked = await answerText(tx, ctx, visit, {
      occasion: 'which-visit',
      inboundId: heard.sms.providerId,
      cause: {
        choices: open.map(({ visitId }) => visitId),
        answered: asked.answer === 'confirm' ? 'confirm' : 'another-time',
        reason: asked.words,
      },
    });
    const words = `Read it: it is not clear which visit is meant. “${heard.sms.body}”`;
    if (!isAsked) await putItem(tx, itemOf(heard, 'unclear-reply', words));
  });
  kickWorker();
}

/** Who writes, and how to reach them. */
export async function hearHelp(heard: Heard): Promise<void> {
  const { lastTold, sender } = heard;
  const visitId = lastTold?.customerId === sender.customerId ? lastTold.visitId : null;
  if (!visitId) {
    const reason = 'Asks who you are: call them.';
    return heard.db.transaction((tx) => keepForPerson(tx, heard, { reason }));
  }
  const ctx = await customerOf(heard, { ...sender, visitId });
  await heard.db.transaction(async (tx) => {
    const reason = 'Asks who you are: answered with your name and phone.';
    if (!(await keepText(tx, heard, { reason }))) return;
    const visit = await lockVisit(tx, ctx, visitId);
    const inboundId = heard.sms.providerId;
    const isAnswered = await answerText(tx, ctx, visit, { occasion: 'help', inboundId });
    const words = 'Asks who you are: call them.';
    if (!isAnswered) await putItem(tx, itemOf(heard, 'unclear-reply', words));
  });
  kickWorker();
}

async function keepForPerson(
  tx: Transaction,
  heard: Heard,
  kept: Parameters<typeof keepText>[2],
): Promise<void> {
  if (!(await keepText(tx, heard, kept))) return;
  const words = `${kept.reason} “${heard.sms.body}”`;
  await putItem(tx, itemOf(heard, 'unclear-reply', words));
}

function customerOf(
  { db, now }: Heard,
  { shopId, name, customerId, visitId }: Pick<Meant, 'shopId' | 'name' | 'customerId' | 'visitId'>,
): Promise<CustomerContext> {
  return shopContext(db, { shopId, actor: { kind: 'customer', name, customerId, visitId }, now });
}
