import type { Database } from '@/db/database';
import { chosenNumber } from '@/lib/messages/chosen-number';
import { type Reply, understandReply } from '@/lib/messages/replies';
import { changeConsent } from '@/server/messages/change-consent';
import { putItem } from '@/server/messages/scheduler-items';
import type { InboundSms } from '@/server/ports/sms/webhooks';
import type { Answer } from './apply-answer';
import { hearAnswer, hearHelp, hearWhich } from './hear-answer';
import { type Heard, itemOf, keepText } from './heard-text';
import { findLastTold, findMeantVisits, findSenders, findVisitOf } from './sms-sender';

/**
 * A text from a customer, whose signature was checked. The provider's number is one for all shops, so the
 * sender's number is looked for in every shop; each text is kept in one, once, whatever it means. What is
 * not clear goes to the scheduler's list: nothing is confirmed or called off by a guess.
 */
export async function hearSms(db: Database, sms: InboundSms, now: Date): Promise<void> {
  const senders = await findSenders(db, sms.from);
  const lastTold = await findLastTold(db, sms.from);
  const sender =
    senders.find(({ customerId }) => customerId === lastTold?.customerId) ?? senders[0];
  if (!sender) return;
  const heard: Heard = { db, sms, now, senders, sender, lastTold };
  const reply = understandReply(sms.body);
  if (reply.meaning === 'stop' || reply.meaning === 'start') return hearConsent(heard, reply);

  const chosen = choiceOf(heard);
  if (chosen) {
    const meant = await findVisitOf(db, sms.from, chosen.visitId);
    return meant ? hearAnswer(heard, meant, chosen.asked) : hearUnclear(heard, reply);
  }
  const asked = answerOf(reply, sms.body);
  if (!asked) {
    return reply.meaning === 'help' ? hearHelp(heard) : hearUnclear(heard, reply);
  }
  const { meant, open } = await findMeantVisits(db, sms.from, { asked, lastTold, now });
  if (meant) return hearAnswer(heard, meant, asked);
  const isOneShop = open.every(({ shopId }) => shopId === open[0]?.shopId);
  if (open.length > 1 && isOneShop) return hearWhich(heard, open, asked);
  return hearUnclear(heard, reply);
}

/** Texts end, or go on, in every shop that has the number. */
async function hearConsent(heard: Heard, reply: Reply): Promise<void> {
  const { db, senders, now } = heard;
  const given = reply.meaning === 'start';
  const how = given ? 'texted START' : 'texted STOP';
  const reason = given
    ? 'May be texted again.'
    : reply.mayCallOffVisit
      ? 'No more texts to this number. They may mean the visit as well: call them.'
      : 'No more texts to this number.';
  await db.transaction(async (tx) => {
    const kept = await keepText(tx, heard, { reason });
    if (!kept) return;
    for (const { shopId, customerId } of senders) {
      await changeConsent(tx, { shopId, customerId, channel: 'sms', given, how, at: now });
    }
    if (reply.mayCallOffVisit) await putItem(tx, itemOf(heard, 'said-stop', reason));
  });
}

async function hearUnclear(heard: Heard, reply: Reply): Promise<void> {
  const reason = unclearWords(reply);
  await heard.db.transaction(async (tx) => {
    const kept = await keepText(tx, heard, { reason });
    if (kept) await putItem(tx, itemOf(heard, 'unclear-reply', `${reason} “${heard.sms.body}”`));
  });
}

/** A number, while the last thing on their phone is our question which visit they mean. */
function choiceOf({ sms, lastTold }: Heard): { visitId: string; asked: Answer } | null {
  if (lastTold?.occasion !== 'which-visit') return null;
  const { choices = [], answered = 'confirm', reason = '' } = lastTold.cause;
  const number = chosenNumber(sms.body, choices.length);
  const visitId = number === null ? undefined : choices[number - 1];
  if (!visitId) return null;
  return { visitId, asked: { answer: answered, words: reason, missing: [] } };
}

function answerOf({ meaning }: Reply, body: string): Answer | null {
  if (meaning === 'yes') return { answer: 'confirm', words: '', missing: [] };
  if (meaning === 'no' || meaning === 'change') {
    return { answer: 'another-time', words: body.trim().slice(0, 400), missing: [] };
  }
  return null;
}

function unclearWords({ meaning, mayCallOffVisit }: Reply): string {
  if (mayCallOffVisit) return 'They may mean to call the visit off: call them.';
  if (meaning === 'unclear') return 'Read it: it is not clear what is meant.';
  return 'Read it: it is not clear which visit is meant.';
}
