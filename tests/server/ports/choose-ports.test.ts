import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { env } from '@/server/base/env';
import { openPorts } from '@/server/ports/choose-ports';

let dataDirectory: string;

beforeEach(async () => {
  dataDirectory = await mkdtemp(path.join(tmpdir(), 'setwell-ports-'));
});
afterEach(() => rm(dataDirectory, { recursive: true }));

test('with nothing configured, texts and e-mail stay on this machine and can be read', async () => {
  const { sms, email, fakes } = await openPorts({
    ...env(),
    dataDirectory,
    sms: null,
    smtpUrl: null,
  });
  expect(await sms.send({ to: '+12025550123', body: 'Hello' })).toMatchObject({ ok: true });
  const mail = { to: 'rosa@tarn.example', subject: 'Hello', text: 'Hello' };
  expect(await email.send(mail)).toMatchObject({ ok: true });
  expect(fakes.sms?.messagesFor('+12025550123')).toMatchObject([{ body: 'Hello' }]);
  expect(fakes.email?.mailsFor('rosa@tarn.example')).toMatchObject([{ subject: 'Hello' }]);
  await fakes.sms?.idle();
  await fakes.sms?.stop();
  await fakes.email?.stop();
});

test('with services configured, no fake is started', async () => {
  const { fakes } = await openPorts({
    ...env(),
    dataDirectory,
    sms: { accountSid: 'AC00000000000000000000000000000001', authToken: 'x', from: '+12025550100' },
    smtpUrl: 'smtp://127.0.0.1:9',
  });
  expect(fakes).toEqual({ sms: null, email: null });
});
