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

test('with nothing configured, nothing leaves this machine: texts and e-mail can be read, roads and addresses are the island’s', async () => {
  const { sms, email, travel, geocode, fakes } = await openPorts({
    ...env(),
    dataDirectory,
    sms: null,
    smtpUrl: null,
    travelUrl: null,
    geocodeUrl: null,
  });
  expect(await sms.send({ to: '+12025550123', body: 'Hello' })).toMatchObject({ ok: true });
  const mail = { to: 'rosa@tarn.example', subject: 'Hello', text: 'Hello' };
  expect(await email.send(mail)).toMatchObject({ ok: true });
  expect(fakes.sms?.messagesFor('+12025550123')).toMatchObject([{ body: 'Hello' }]);
  expect(fakes.email?.mailsFor('rosa@tarn.example')).toMatchObject([{ subject: 'Hello' }]);
  const towns = [
    { lat: 41.284, lon: -58.312 },
    { lat: 41.217, lon: -58.312 },
  ];
  expect(await travel.route(towns)).toMatchObject({ ok: true });
  expect(await geocode.find({ text: 'Quay Rise', country: null })).toMatchObject({ ok: true });
  await fakes.travel?.stop();
  await fakes.geocode?.stop();
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
    travelUrl: 'http://127.0.0.1:9',
    geocodeUrl: 'http://127.0.0.1:9',
  });
  expect(fakes).toEqual({ sms: null, email: null, travel: null, geocode: null });
});
