/** The provider's HTTP API for messages, and a small door beside it by which a test plays the customer. */
import type { IncomingMessage, ServerResponse } from 'node:http';
import { setTimeout as wait } from 'node:timers/promises';
import type { FaultSwitch } from '@/server/ports/fakes/fault-switch';
import { errorAnswer, type FakeAnswer, listAnswer, messageAnswer } from './fake-sms-answers';
import { type FakeCarrier, newText, type ReportStep } from './fake-sms-carrier';
import type { FakeAccount } from './fake-sms-posts';
import type { FakeSmsStore } from './fake-sms-store';

export type SmsFault =
  /** Answered with this provider code: 21610, 21211, 20429, 20500 … */
  | { kind: 'refuse'; code: number }
  /** Taken, but answered only after this long. */
  | { kind: 'slow'; delayMs: number }
  /** The connection breaks before the text was taken, or after it. */
  | { kind: 'drop-before' }
  | { kind: 'drop-after' }
  /** Taken, and reported in this way: failure, never, twice, late, out of order. */
  | { kind: 'report'; steps: ReportStep[] };

export type FakeSmsParts = {
  account: FakeAccount;
  store: FakeSmsStore;
  carrier: FakeCarrier;
  faults: FaultSwitch<SmsFault>;
};

const MOST_BODY_BYTES = 64 * 1024;
const MOST_CHARACTERS = 1600;

/** Null: the connection is broken without an answer. */
type Handled = FakeAnswer | null;

export function fakeSmsApi(parts: FakeSmsParts) {
  return async (request: IncomingMessage, response: ServerResponse): Promise<void> => {
    const answer = await handle(parts, request);
    if (!answer) {
      request.socket.destroy();
      return;
    }
    response.writeHead(answer.status, { 'content-type': 'application/json;charset=utf-8' });
    response.end(JSON.stringify(answer.body));
  };
}

async function handle(parts: FakeSmsParts, request: IncomingMessage): Promise<Handled> {
  const { account, store } = parts;
  const url = new URL(request.url ?? '/', 'http://fake.example');
  if (!isOurs(account, request.headers.authorization)) return errorAnswer(20003);
  const body = await readBody(request);
  const messages = `/2010-04-01/Accounts/${account.accountSid}/Messages`;
  if (url.pathname === `${messages}.json`) {
    if (request.method === 'POST') return send(parts, new URLSearchParams(body));
    return listAnswer(account.accountSid, store.all(), url.searchParams);
  }
  if (url.pathname.startsWith(`${messages}/`) && request.method === 'GET') {
    const text = store.text(url.pathname.slice(messages.length + 1).replace(/\.json$/, ''));
    return text ? messageAnswer(account.accountSid, text) : errorAnswer(20404);
  }
  if (url.pathname === '/control/inbound' && request.method === 'POST') return control(parts, body);
  return errorAnswer(20404);
}

async function send(
  { account, store, carrier, faults }: FakeSmsParts,
  form: URLSearchParams,
): Promise<Handled> {
  const to = form.get('To') ?? '';
  const from = form.get('From') ?? '';
  const body = form.get('Body') ?? '';
  const fault = faults.take(to);
  if (fault?.kind === 'drop-before') return null;
  if (fault?.kind === 'refuse') return errorAnswer(fault.code);
  const refused = whyRefused({ to, from, body, number: account.number });
  if (refused) return errorAnswer(refused);
  if (store.hasOptedOut(to)) return errorAnswer(21610);

  const statusCallback = form.get('StatusCallback');
  const text = newText({
    direction: 'outbound-api',
    from,
    to,
    body,
    status: 'queued',
    statusCallback,
  });
  await store.addText(text);
  carrier.deliver(text, fault?.kind === 'report' ? fault.steps : carrier.usualSteps);
  if (fault?.kind === 'drop-after') return null;
  if (fault?.kind === 'slow') await wait(fault.delayMs);
  return messageAnswer(account.accountSid, text, 201);
}

function whyRefused(sms: {
  to: string;
  from: string;
  body: string;
  number: string;
}): number | null {
  if (sms.to === '') return 21604;
  if (!/^\+[1-9]\d{6,14}$/.test(sms.to)) return 21211;
  if (sms.from !== sms.number) return 21606;
  if (sms.body === '') return 21602;
  return sms.body.length > MOST_CHARACTERS ? 21617 : null;
}

async function control({ carrier }: FakeSmsParts, body: string): Promise<FakeAnswer> {
  const form = new URLSearchParams(body);
  const from = form.get('From');
  const text = form.get('Body');
  if (!from || text === null) return errorAnswer(21604);
  return { status: 200, body: { webhook_status: await carrier.inbound({ from, body: text }) } };
}

function isOurs(
  { accountSid, authToken }: FakeAccount,
  authorization: string | undefined,
): boolean {
  const expected = Buffer.from(`${accountSid}:${authToken}`).toString('base64');
  return authorization === `Basic ${expected}`;
}

async function readBody(request: IncomingMessage): Promise<string> {
  const chunks: Buffer[] = [];
  let bytes = 0;
  for await (const chunk of request) {
    bytes += (chunk as Buffer).length;
    if (bytes > MOST_BODY_BYTES) throw new Error('the body is too long for a text message');
    chunks.push(chunk as Buffer);
  }
  return Buffer.concat(chunks).toString('utf8');
}
