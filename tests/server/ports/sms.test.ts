import { appendFile, mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { type FakeSms, startFakeSms } from '@/server/ports/sms/fake-sms';
import { twilioSms } from '@/server/ports/sms/twilio-sms';
import { readInboundSms, readSmsReport } from '@/server/ports/sms/webhooks';
import { listen } from './listen';

const account = {
  accountSid: 'AC00000000000000000000000000000001',
  authToken: 'a-token-for-tests',
  number: '+12025550100',
};
const customer = '+12025550123';

let folder: string;
let app: Awaited<ReturnType<typeof listen>>;
let fake: FakeSms;

const start = (port = 0) =>
  startFakeSms({
    account,
    file: path.join(folder, 'sms.jsonl'),
    inboundUrl: `${app.url}/inbound`,
    reportAfterMs: 5,
    port,
  });

const portTo = (apiBaseUrl: string, timeoutMs = 2_000) =>
  twilioSms({ ...account, from: account.number, apiBaseUrl, timeoutMs });

beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'setwell-sms-'));
  app = await listen();
  fake = await start();
});

afterEach(async () => {
  await fake.stop();
  await app.stop();
  await rm(folder, { recursive: true });
});

describe('sending', () => {
  test('puts the text on the phone of the customer and reports its delivery', async () => {
    const sms = portTo(fake.apiBaseUrl);
    const sent = await sms.send({
      to: customer,
      body: 'We come Tue, May 12.',
      statusCallback: `${app.url}/report?shop=1`,
      idempotencyKey: 'visit-1:1:booked:sms',
    });
    expect(sent).toMatchObject({ ok: true, state: 'waiting' });
    await fake.idle();

    expect(fake.messagesFor(customer)).toMatchObject([
      { direction: 'outbound-api', body: 'We come Tue, May 12.', status: 'delivered' },
    ]);
    expect(app.posts.map((post) => post.params.MessageStatus)).toEqual(['sent', 'delivered']);
    expect(app.posts[0]?.path).toBe('/report?shop=1&key=visit-1%3A1%3Abooked%3Asms');
    expect(readSmsReport(app.posts[1]?.params ?? {})).toEqual({
      providerId: sent.ok && sent.providerId,
      state: 'delivered',
      isFinal: true,
      refusal: null,
    });
  });

  test('signs its reports over the whole public address, so that a changed one is not genuine', async () => {
    const sms = portTo(fake.apiBaseUrl);
    await sms.send({ to: customer, body: 'Hello', statusCallback: `${app.url}/report` });
    await fake.idle();
    const post = app.posts[0];
    const signature = post?.headers['x-twilio-signature'] ?? '';
    const params = post?.params ?? {};
    const url = `${app.url}/report`;
    expect(sms.isGenuine({ url, params, signature })).toBe(true);
    expect(sms.isGenuine({ url: `${url}?more=1`, params, signature })).toBe(false);
    expect(sms.isGenuine({ url, params: { ...params, MessageStatus: 'read' }, signature })).toBe(
      false,
    );
    expect(sms.isGenuine({ url, params, signature: '' })).toBe(false);
  });

  test.each([
    ['a number that does not exist', 'call me', 'bad-number', 21211],
    ['an empty text', customer, 'blocked', 21602],
  ])('is refused %s', async (_, to, code, providerCode) => {
    const body = code === 'blocked' ? '' : 'Hello';
    const result = await portTo(fake.apiBaseUrl).send({ to, body });
    expect(result).toMatchObject({ ok: false, refusal: { code, providerCode, retry: 'never' } });
  });

  test('is refused a text of more than 1600 characters', async () => {
    const result = await portTo(fake.apiBaseUrl).send({ to: customer, body: 'a'.repeat(1601) });
    expect(result).toMatchObject({ ok: false, refusal: { code: 'blocked', providerCode: 21617 } });
  });

  test('is refused with a wrong token, as a fault of the account', async () => {
    const stranger = twilioSms({
      ...account,
      authToken: 'guessed',
      from: account.number,
      apiBaseUrl: fake.apiBaseUrl,
    });
    expect(await stranger.send({ to: customer, body: 'Hello' })).toMatchObject({
      ok: false,
      refusal: { code: 'misconfigured', retry: 'never', providerCode: 20003 },
    });
    expect(fake.messagesFor(customer)).toEqual([]);
  });

  test('is refused from a number that is not the shop', async () => {
    const other = twilioSms({ ...account, from: '+12025550199', apiBaseUrl: fake.apiBaseUrl });
    expect(await other.send({ to: customer, body: 'Hello' })).toMatchObject({
      ok: false,
      refusal: { code: 'misconfigured', providerCode: 21606 },
    });
  });
});

describe('faults of the provider', () => {
  test.each([
    [20429, 'busy', 'later'],
    [21610, 'opted-out', 'never'],
    [21614, 'cannot-receive', 'never'],
    [20500, 'no-answer', 'ask-first'],
  ])('code %i is %s, tried again %s', async (providerCode, code, retry) => {
    fake.faults.set({ kind: 'refuse', code: providerCode }, { times: 1 });
    const sms = portTo(fake.apiBaseUrl);
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({
      ok: false,
      refusal: { code, retry, providerCode },
    });
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({ ok: true });
  });

  test('a fault set for one number leaves the others alone', async () => {
    fake.faults.set({ kind: 'refuse', code: 21610 }, { to: customer });
    const sms = portTo(fake.apiBaseUrl);
    expect(await sms.send({ to: '+12025550124', body: 'Hello' })).toMatchObject({ ok: true });
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({ ok: false });
    fake.faults.clear();
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({ ok: true });
  });

  test('an answer lost after the text was taken is settled by looking, not by sending again', async () => {
    fake.faults.set({ kind: 'drop-after' }, { times: 1 });
    const sms = portTo(fake.apiBaseUrl);
    const since = new Date();
    expect(await sms.send({ to: customer, body: 'We come at 8.' })).toMatchObject({
      ok: false,
      refusal: { code: 'no-answer', retry: 'ask-first' },
    });
    const [text] = fake.messagesFor(customer);
    expect(await sms.findSent({ to: customer, body: 'We come at 8.', since })).toMatchObject({
      ok: true,
      found: { providerId: text?.sid },
    });
    expect(await sms.findSent({ to: customer, body: 'We come at 9.', since })).toEqual({
      ok: true,
      found: null,
    });
  });

  test('a text lost before it was taken is not found', async () => {
    fake.faults.set({ kind: 'drop-before' }, { times: 1 });
    const sms = portTo(fake.apiBaseUrl);
    const since = new Date();
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({
      ok: false,
      refusal: { retry: 'ask-first' },
    });
    expect(await sms.findSent({ to: customer, body: 'Hello', since })).toEqual({
      ok: true,
      found: null,
    });
  });

  test('the same text of an earlier day is not taken for the lost one', async () => {
    const sms = portTo(fake.apiBaseUrl);
    await sms.send({ to: customer, body: 'Hello' });
    const since = new Date(Date.now() + 2_000);
    expect(await sms.findSent({ to: customer, body: 'Hello', since })).toMatchObject({
      found: null,
    });
  });

  test('a slow answer is given up, and the text may have been sent', async () => {
    fake.faults.set({ kind: 'slow', delayMs: 1_000 }, { times: 1 });
    const result = await portTo(fake.apiBaseUrl, 100).send({ to: customer, body: 'Hello' });
    expect(result).toMatchObject({ ok: false, refusal: { code: 'no-answer', retry: 'ask-first' } });
    expect(fake.messagesFor(customer)).toHaveLength(1);
  });

  test('nobody at the address of the provider means that nothing was sent', async () => {
    const sms = portTo(fake.apiBaseUrl);
    await fake.stop();
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({
      ok: false,
      refusal: { code: 'unreachable', retry: 'later' },
    });
  });

  test('a failed delivery is reported with its reason', async () => {
    fake.faults.set({
      kind: 'report',
      steps: [
        { status: 'sent', afterMs: 1 },
        { status: 'undelivered', errorCode: 30006, afterMs: 1 },
      ],
    });
    const sms = portTo(fake.apiBaseUrl);
    const sent = await sms.send({ to: customer, body: 'Hello', statusCallback: `${app.url}/r` });
    await fake.idle();
    expect(readSmsReport(app.posts.at(-1)?.params ?? {})).toMatchObject({
      state: 'not-delivered',
      isFinal: true,
      refusal: { code: 'cannot-receive', providerCode: 30006 },
    });
    expect(await sms.find(sent.ok ? sent.providerId : '')).toMatchObject({
      ok: true,
      found: { state: 'not-delivered', refusal: { code: 'cannot-receive' } },
    });
  });

  test('reports may never come, or come twice', async () => {
    const sms = portTo(fake.apiBaseUrl);
    fake.faults.set({ kind: 'report', steps: [] }, { times: 1 });
    await sms.send({ to: customer, body: 'One', statusCallback: `${app.url}/r` });
    await fake.idle();
    expect(app.posts).toHaveLength(0);
    const twice = { status: 'delivered', afterMs: 1 };
    fake.faults.set({ kind: 'report', steps: [twice, twice] }, { times: 1 });
    await sms.send({ to: customer, body: 'Two', statusCallback: `${app.url}/r` });
    await fake.idle();
    expect(app.posts).toHaveLength(2);
  });
});

test('an unknown message id is not found, which is an answer and not a fault', async () => {
  expect(await portTo(fake.apiBaseUrl).find('SM00000000000000000000000000000000')).toEqual({
    ok: true,
    found: null,
  });
});

test('lists texts page by page, newest first', async () => {
  const sms = portTo(fake.apiBaseUrl);
  for (const body of ['one', 'two', 'three']) await sms.send({ to: customer, body });
  const headers = { authorization: `Basic ${btoa(`${account.accountSid}:${account.authToken}`)}` };
  const pages: string[][] = [];
  let next: string | null =
    `/2010-04-01/Accounts/${account.accountSid}/Messages.json?PageSize=2&To=%2B12025550123`;
  while (next) {
    const answer: Response = await fetch(`${fake.apiBaseUrl}${next}`, { headers });
    const page = (await answer.json()) as { messages: { body: string }[]; next_page_uri: string };
    pages.push(page.messages.map(({ body }) => body));
    next = page.next_page_uri;
  }
  expect(pages).toEqual([['three', 'two'], ['one']]);
});

describe('a customer who writes', () => {
  test('is posted to us, signed', async () => {
    const status = await fake.inbound({ from: customer, body: 'Yes, fine' });
    expect(status).toBe(204);
    const post = app.posts[0];
    expect(readInboundSms(post?.params ?? {})).toMatchObject({
      from: customer,
      to: account.number,
      body: 'Yes, fine',
    });
    const signature = post?.headers['x-twilio-signature'] ?? '';
    const url = `${app.url}/inbound`;
    expect(portTo(fake.apiBaseUrl).isGenuine({ url, params: post?.params ?? {}, signature })).toBe(
      true,
    );
  });

  test('is posted through the control door too, for tests in another process', async () => {
    const authorization = `Basic ${btoa(`${account.accountSid}:${account.authToken}`)}`;
    const body = new URLSearchParams({ From: customer, Body: 'SÍ' });
    const door = `${fake.apiBaseUrl}/control/inbound`;
    const answer = await fetch(door, { method: 'POST', body, headers: { authorization } });
    expect(await answer.json()).toEqual({ webhook_status: 204 });
    expect(app.posts[0]?.params.Body).toBe('SÍ');
    expect((await fetch(door, { method: 'POST', body })).status).toBe(401);
  });

  test('gets nothing after STOP, is told so once by the provider, and gets texts again after START', async () => {
    const sms = portTo(fake.apiBaseUrl);
    await fake.inbound({ from: customer, body: ' stop ' });
    await fake.inbound({ from: customer, body: 'STOP' });
    expect(app.posts.map((post) => post.params.OptOutType)).toEqual(['STOP', 'STOP']);
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({
      ok: false,
      refusal: { code: 'opted-out', providerCode: 21610 },
    });
    const answers = () =>
      fake.messagesFor(customer).filter((text) => text.direction === 'outbound-reply');
    expect(answers()).toHaveLength(1);
    await fake.inbound({ from: customer, body: 'START' });
    expect(answers()).toHaveLength(2);
    expect(await sms.send({ to: customer, body: 'Hello' })).toMatchObject({ ok: true });
  });

  test('who says YES while opted in confirms only: the word reaches us as any other', async () => {
    await fake.inbound({ from: customer, body: 'YES' });
    expect(app.posts[0]?.params).toMatchObject({ Body: 'YES' });
    expect(app.posts[0]?.params.OptOutType).toBeUndefined();
  });

  test('gets no status when our webhook is down, and the text stays on the phone', async () => {
    await app.stop();
    expect(await fake.inbound({ from: customer, body: 'Hello?' })).toBeNull();
    expect(fake.messagesFor(customer)).toHaveLength(1);
    app = await listen();
  });
});

describe('a restart', () => {
  test('keeps the phone, the opt-outs, and what was still to be delivered', async () => {
    const sms = portTo(fake.apiBaseUrl);
    fake.faults.set({ kind: 'report', steps: [{ status: 'delivered', afterMs: 60_000 }] });
    await sms.send({ to: customer, body: 'Hello', statusCallback: `${app.url}/r` });
    await fake.inbound({ from: '+12025550144', body: 'STOP' });
    await fake.stop();
    await appendFile(path.join(folder, 'sms.jsonl'), '{"is":"text","te');

    fake = await start();
    expect(fake.numbers()).toEqual(['+12025550144', customer]);
    expect(fake.hasOptedOut('+12025550144')).toBe(true);
    await fake.idle();
    expect(fake.messagesFor(customer)).toMatchObject([{ body: 'Hello', status: 'delivered' }]);
    expect(app.posts.map((post) => post.params.MessageStatus)).toContain('delivered');
    await fake.stop();

    fake = await start();
    expect(fake.messagesFor(customer)).toMatchObject([{ status: 'delivered' }]);
  });

  test('takes the port that it is given, and says when it is taken', async () => {
    const port = Number(new URL(fake.apiBaseUrl).port);
    await expect(start(port)).rejects.toThrow('EADDRINUSE');
    await fake.stop();
    fake = await start(port);
    expect(fake.apiBaseUrl).toBe(`http://127.0.0.1:${port}`);
  });
});
