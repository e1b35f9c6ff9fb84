import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { type FakeEmail, startFakeEmail } from '@/server/ports/email/fake-email';
import { smtpEmail } from '@/server/ports/email/smtp-email';

const customer = 'rosa@tarn.example';
const from = 'Juniper Bend <hello@juniperbend.example>';
const plain = { to: customer, subject: 'Your measure', text: 'We come Tue, May 12.' };

let folder: string;
let fake: FakeEmail;

const start = () => startFakeEmail({ file: path.join(folder, 'email.jsonl') });
const portTo = (smtpUrl: string, timeoutMs = 2_000) => smtpEmail({ smtpUrl, from, timeoutMs });

beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'setwell-email-'));
  fake = await start();
});

afterEach(async () => {
  await fake.stop();
  await rm(folder, { recursive: true });
});

describe('sending', () => {
  test('puts text, HTML and who to answer into the inbox', async () => {
    const sent = await portTo(fake.smtpUrl).send({
      ...plain,
      html: '<p>We come <b>Tuesday</b>. Señora Peña: ¡hola!</p>',
      replyTo: 'office@juniperbend.example',
      idempotencyKey: 'visit-1:1:booked:email',
    });
    expect(sent).toEqual({ ok: true, providerId: '<visit-1-1-booked-email@juniperbend.example>' });
    expect(fake.mailsFor(customer)).toMatchObject([
      {
        from: '"Juniper Bend" <hello@juniperbend.example>',
        to: customer,
        replyTo: 'office@juniperbend.example',
        subject: 'Your measure',
        html: expect.stringContaining('Señora Peña: ¡hola!'),
        messageId: '<visit-1-1-booked-email@juniperbend.example>',
        headers: { 'auto-submitted': 'auto-generated' },
      },
    ]);
    expect(fake.mailsFor(customer)[0]?.text.trim()).toBe('We come Tue, May 12.');
  });

  test('carries a calendar object with its method', async () => {
    const content = [
      'BEGIN:VCALENDAR',
      'VERSION:2.0',
      'PRODID:-//Setwell//EN',
      'METHOD:REQUEST',
      'BEGIN:VEVENT',
      'UID:visit-1@setwell.example',
      'DTSTAMP:20260501T120000Z',
      'DTSTART:20260512T140000Z',
      'END:VEVENT',
      'END:VCALENDAR',
      '',
    ].join('\r\n');
    await portTo(fake.smtpUrl).send({ ...plain, ics: { content, method: 'REQUEST' } });
    const attachments = fake.mailsFor(customer)[0]?.attachments ?? [];
    expect(attachments.map(({ contentType }) => contentType)).toContain('text/calendar');
    expect(attachments.map(({ filename }) => filename)).toContain('visit.ics');
    for (const { base64 } of attachments) {
      expect(Buffer.from(base64, 'base64').toString()).toContain('UID:visit-1@setwell.example');
    }
  });

  test.each([
    ['a second recipient', 'rosa@tarn.example, eve@elsewhere.example'],
    ['a header', 'rosa@tarn.example\r\nBcc: eve@elsewhere.example'],
  ])('does not let an address smuggle in %s', async (_, to) => {
    await portTo(fake.smtpUrl).send({ ...plain, to });
    expect(fake.mailsFor('eve@elsewhere.example')).toEqual([]);
  });

  test('does not let a subject smuggle in a header', async () => {
    await portTo(fake.smtpUrl).send({ ...plain, subject: 'Hello\r\nBcc: eve@elsewhere.example' });
    expect(fake.mailsFor('eve@elsewhere.example')).toEqual([]);
    const [mail] = fake.mailsFor(customer);
    expect(mail?.headers.bcc).toBeUndefined();
    expect(mail?.subject).toBe('Hello Bcc: eve@elsewhere.example');
  });
});

describe('faults of the mail server', () => {
  test.each([
    [550, 'bad-address', 'never'],
    [421, 'deferred', 'later'],
  ])('code %i is %s, tried again %s', async (providerCode, code, retry) => {
    fake.faults.set({ kind: 'refuse', code: providerCode }, { times: 1 });
    const email = portTo(fake.smtpUrl);
    expect(await email.send(plain)).toMatchObject({
      ok: false,
      refusal: { code, retry, providerCode },
    });
    expect(await email.send(plain)).toMatchObject({ ok: true });
    expect(fake.mailsFor(customer)).toHaveLength(1);
  });

  test('a greylisting server takes the second try', async () => {
    fake.faults.set({ kind: 'greylist' });
    const email = portTo(fake.smtpUrl);
    expect(await email.send(plain)).toMatchObject({
      ok: false,
      refusal: { code: 'deferred', retry: 'later', providerCode: 451 },
    });
    expect(await email.send(plain)).toMatchObject({ ok: true });
  });

  test('a connection broken before the mail was taken leaves the inbox empty', async () => {
    fake.faults.set({ kind: 'drop-before' }, { times: 1 });
    expect(await portTo(fake.smtpUrl).send(plain)).toMatchObject({
      ok: false,
      refusal: { code: 'no-answer', retry: 'later' },
    });
    expect(fake.mailsFor(customer)).toEqual([]);
  });

  test('a mail whose answer was lost comes again under the same id, so that readers see one', async () => {
    fake.faults.set({ kind: 'drop-after' }, { times: 1 });
    const email = portTo(fake.smtpUrl);
    const keyed = { ...plain, idempotencyKey: 'visit-1' };
    expect(await email.send(keyed)).toMatchObject({ ok: false, refusal: { code: 'no-answer' } });
    expect(await email.send(keyed)).toMatchObject({ ok: true });
    const ids = fake.mailsFor(customer).map(({ messageId }) => messageId);
    expect(ids).toEqual(['<visit-1@juniperbend.example>', '<visit-1@juniperbend.example>']);
  });

  test('a slow server is given up', async () => {
    fake.faults.set({ kind: 'slow', delayMs: 1_000 }, { times: 1 });
    expect(await portTo(fake.smtpUrl, 150).send(plain)).toMatchObject({
      ok: false,
      refusal: { code: 'no-answer' },
    });
  });

  test('nobody at the address of the server means that nothing was sent', async () => {
    const email = portTo(fake.smtpUrl);
    await fake.stop();
    expect(await email.send(plain)).toMatchObject({
      ok: false,
      refusal: { code: 'unreachable', retry: 'later' },
    });
    fake = await start();
  });

  test('an address that is none is refused and not retried', async () => {
    expect(await portTo(fake.smtpUrl).send({ ...plain, to: 'nobody' })).toMatchObject({
      ok: false,
      refusal: { code: 'bad-address', retry: 'never' },
    });
  });
});

test('a restart keeps the inbox', async () => {
  await portTo(fake.smtpUrl).send(plain);
  await fake.stop();
  fake = await start();
  expect(fake.addresses()).toEqual([customer]);
  expect(fake.mailsFor('Rosa@tarn.example')).toMatchObject([{ subject: 'Your measure' }]);
});
