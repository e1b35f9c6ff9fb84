import os from 'node:os';
import path from 'node:path';
import { startFakeEmail } from '@/server/ports/email/fake-email';
import { smtpEmail } from '@/server/ports/email/smtp-email';
import { startFakeSms } from '@/server/ports/sms/fake-sms';
import { twilioSms } from '@/server/ports/sms/twilio-sms';

/** Long enough that no report goes out before the fake is stopped: nobody listens for them here. */
const never = 1_000_000;

let opened = 0;

/** The real SDKs against fakes of their own, with fault switches. */
export async function openTestPorts() {
  opened += 1;
  const file = (name: string) =>
    path.join(os.tmpdir(), `setwell-fakes-${process.pid}-${opened}`, name);
  const account = { accountSid: `AC${'0'.repeat(32)}`, authToken: 'token', number: '+12025550100' };
  const inboundUrl = 'http://localhost:3000/api/webhooks/sms';
  const fakeSms = await startFakeSms({
    account,
    file: file('sms.jsonl'),
    inboundUrl,
    reportAfterMs: never,
  });
  const fakeEmail = await startFakeEmail({ file: file('email.jsonl') });
  const sms = twilioSms({ ...account, from: account.number, apiBaseUrl: fakeSms.apiBaseUrl });
  const email = smtpEmail({ smtpUrl: fakeEmail.smtpUrl, from: 'Setwell <no-reply@shop.example>' });
  return {
    ports: { sms, email },
    fakeSms,
    fakeEmail,
    stop: async () => {
      await Promise.all([fakeSms.stop(), fakeEmail.stop()]);
    },
  };
}
