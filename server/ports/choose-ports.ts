/**
 * Who carries texts and e-mail: the real services where the environment names them, and fakes on loopback
 * for what it does not, started once a process and held over a reload of the code.
 */
import { randomBytes } from 'node:crypto';
import path from 'node:path';
import { apiPaths } from '@/lib/paths';
import { type Env, env } from '@/server/base/env';
import type { EmailPort } from './email/email-port';
import { type FakeEmail, startFakeEmail } from './email/fake-email';
import { smtpEmail } from './email/smtp-email';
import { type FakeSms, startFakeSms } from './sms/fake-sms';
import type { SmsPort } from './sms/sms-port';
import { twilioSms } from './sms/twilio-sms';

export type Ports = {
  sms: SmsPort;
  email: EmailPort;
  /** Null where the real service is used. */
  fakes: { sms: FakeSms | null; email: FakeEmail | null };
};

/** The number that the fake provider texts from; from the range kept for fiction. */
const FAKE_NUMBER = '+12025550100';

const held = globalThis as typeof globalThis & { setwellPorts?: Promise<Ports> };

export function getPorts(): Promise<Ports> {
  held.setwellPorts ??= openPorts(env()).catch((error) => {
    held.setwellPorts = undefined;
    throw error;
  });
  return held.setwellPorts;
}

export async function openPorts(settings: Env): Promise<Ports> {
  const [sms, email] = await Promise.all([chooseSms(settings), chooseEmail(settings)]);
  return { sms: sms.port, email: email.port, fakes: { sms: sms.fake, email: email.fake } };
}

async function chooseSms({ sms, dataDirectory, publicUrl }: Env) {
  if (sms) return { port: twilioSms(sms), fake: null };
  // Made anew each time, so that nobody outside this process can sign a webhook.
  const account = {
    accountSid: `AC${randomBytes(16).toString('hex')}`,
    authToken: randomBytes(16).toString('hex'),
    number: FAKE_NUMBER,
  };
  const fake = await startFakeSms({
    account,
    file: path.join(/*turbopackIgnore: true*/ dataDirectory, 'fakes', 'sms.jsonl'),
    inboundUrl: `${publicUrl}${apiPaths.smsWebhook()}`,
  });
  const { accountSid, authToken, number } = account;
  return {
    port: twilioSms({ accountSid, authToken, from: number, apiBaseUrl: fake.apiBaseUrl }),
    fake,
  };
}

async function chooseEmail({ smtpUrl, emailFrom, dataDirectory }: Env) {
  if (smtpUrl) return { port: smtpEmail({ smtpUrl, from: emailFrom }), fake: null };
  const fake = await startFakeEmail({
    file: path.join(/*turbopackIgnore: true*/ dataDirectory, 'fakes', 'email.jsonl'),
  });
  return { port: smtpEmail({ smtpUrl: fake.smtpUrl, from: emailFrom }), fake };
}
