import { randomUUID } from 'node:crypto';
import { setTimeout as wait } from 'node:timers/promises';
import type { SendTestInput, TestAnswer } from '@/lib/contracts/messages';
import { emailHtml } from '@/lib/messages/email-html';
import { plainSms } from '@/lib/messages/plain-sms';
import { buttonWords } from '@/lib/messages/render-message';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { countTry } from '@/server/base/limits';
import { getPorts, type Ports } from '@/server/ports/choose-ports';
import type { SmsReport } from '@/server/ports/sms/sms-port';
import { phoneOf } from '@/server/shops/phone-of';
import { testAdvice } from './test-advice';

const limit = { most: 10, windowSeconds: 600 };
/** A text is asked about until the carrier has said what became of it, for so long. */
const askEveryMs = 1_000;
const mostAsks = 8;

/** To the owner's own phone or inbox, past the outbox, so that what the service says is seen at once. */
export async function sendTest(ctx: PersonContext, input: SendTestInput): Promise<TestAnswer> {
  mustBeAllowed(ctx, 'shop:change');
  await countTry(ctx.db, `message-test:${ctx.shop.id}`, limit, ctx.now);
  const ports = await getPorts();
  return input.channel === 'sms' ? sendText(ctx, ports, input.to) : sendMail(ctx, ports, input.to);
}

async function sendText(ctx: PersonContext, { sms }: Ports, typed: string): Promise<TestAnswer> {
  const to = phoneOf(ctx.shop, typed, 'to');
  const body = plainSms(`${ctx.shop.name}: this is a test. Texts to customers look like this.`);
  const sent = await sms.send({ to, body, idempotencyKey: randomUUID() });
  if (!sent.ok) return failed(sent.refusal);
  const report = await finalReport(sms, sent.providerId);
  if (report?.state === 'delivered') {
    const message = 'The text has arrived.';
    return { arrived: 'yes', message, advice: '', detail: sent.providerId };
  }
  if (report?.refusal) return failed(report.refusal);
  return {
    arrived: 'sent',
    message: 'The provider took the text and has not said yet whether it arrived.',
    advice: 'Look at the phone. If nothing comes within minutes, ask the provider by the id below.',
    detail: sent.providerId,
  };
}

async function finalReport(sms: Ports['sms'], providerId: string): Promise<SmsReport | null> {
  for (let asked = 0; asked < mostAsks; asked += 1) {
    await wait(askEveryMs);
    const lookup = await sms.find(providerId);
    if (lookup.ok && lookup.found?.isFinal) return lookup.found;
  }
  return null;
}

async function sendMail(ctx: PersonContext, { email }: Ports, to: string): Promise<TestAnswer> {
  const text = `This is a test from ${ctx.shop.name}. E-mail to customers looks like this.`;
  const sent = await email.send({
    to,
    subject: `A test from ${ctx.shop.name}`.replace(/\p{Cc}+/gu, ' '),
    text,
    html: emailHtml({ text, language: 'en', buttonWords: buttonWords.en }),
    idempotencyKey: randomUUID(),
    ...(ctx.shop.email ? { replyTo: ctx.shop.email } : {}),
  });
  if (!sent.ok) return failed(sent.refusal);
  return {
    arrived: 'sent',
    message: 'The e-mail server took it.',
    advice:
      'Look into the inbox. If it is among the junk, the domain of the sender needs SPF and DKIM.',
    detail: sent.providerId,
  };
}

function failed(refusal: {
  code: string;
  message: string;
  detail: string;
  providerCode: number | null;
}): TestAnswer {
  const { code, message, providerCode } = refusal;
  const detail = [providerCode, refusal.detail].filter(Boolean).join(': ');
  return { arrived: 'no', message, advice: testAdvice(code), detail };
}
