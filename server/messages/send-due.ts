import type { Database } from '@/db/database';
import { countSegments } from '@/lib/messages/segments';
import { apiPaths } from '@/lib/paths';
import type { Context, SystemActor } from '@/server/base/context';
import { env } from '@/server/base/env';
import { logBug } from '@/server/base/log';
import { shopContext } from '@/server/base/shop-context';
import type { Ports } from '@/server/ports/choose-ports';
import { type Claimed, claimDue } from './claim-due';
import type { Compose, Composed } from './compose';
import { type Prepared, prepare } from './prepare';
import { giveUpWhileHeld, writeRefusal, writeSent, writeWhileHeld } from './write-outcome';

export type Sending = {
  db: Database;
  ports: Pick<Ports, 'sms' | 'email'>;
  compose: Compose;
  /** The clock, asked anew for each batch. */
  now: () => Date;
};

/** Sends all that is due; gives how many messages it took. Any number of workers may run at once. */
export async function sendDue(sending: Sending): Promise<number> {
  let taken = 0;
  for (;;) {
    const batch = await claimDue(sending.db, sending.now());
    if (batch.length === 0) return taken;
    taken += batch.length;
    const contextOf = shopContexts(sending.db, sending.now());
    await Promise.all(batch.map((message) => sendOne(sending, message, contextOf)));
  }
}

/** Each shop of a batch is read once. */
function shopContexts(db: Database, now: Date) {
  const read = new Map<string, Promise<Context<SystemActor>>>();
  return (shopId: string) => {
    const known = read.get(shopId);
    if (known) return known;
    const context = shopContext(db, { shopId, actor: { kind: 'system', name: 'Setwell' }, now });
    read.set(shopId, context);
    return context;
  };
}

/** A bug over one message keeps neither the others nor the next try; its lease lapses and it is settled. */
async function sendOne(
  sending: Sending,
  message: Claimed,
  contextOf: ReturnType<typeof shopContexts>,
): Promise<void> {
  try {
    const ctx = await contextOf(message.shopId);
    const prepared = await prepare(ctx, message, sending.compose);
    if (prepared.is === 'ready') await carry(sending, message, prepared);
    else await putAside(sending.db, message, prepared, ctx.now);
  } catch (error) {
    logBug('messages/send-due', error);
  }
}

async function putAside(
  db: Database,
  message: Claimed,
  prepared: Exclude<Prepared, { is: 'ready' }>,
  now: Date,
): Promise<void> {
  // Waiting for the morning is no failed try.
  const attempts = message.attempts - 1;
  if (prepared.is === 'later') {
    await writeWhileHeld(db, message, { state: 'waiting', dueAt: prepared.dueAt, attempts });
    return;
  }
  // What stands against one visit stands against no other: those are looked at by themselves.
  const alone = { ...message, others: [] };
  if (prepared.is === 'refused') {
    await giveUpWhileHeld(db, alone, { message: prepared.reason, code: null }, now);
  } else {
    await writeWhileHeld(db, alone, { state: 'withdrawn', reason: prepared.reason });
  }
  for (const other of eachAlone(message.others)) {
    await writeWhileHeld(db, other, { state: 'waiting', dueAt: now, attempts });
  }
}

function eachAlone(others: Claimed['others']): Claimed[] {
  return others.map((other) => ({ ...other, others: [] }));
}

/** What goes out is written down first, so that after a crash the provider can be asked for it. */
async function carry(
  sending: Sending,
  message: Claimed,
  { to, composed }: Extract<Prepared, { is: 'ready' }>,
): Promise<void> {
  const { db } = sending;
  const body = composed.is === 'sms' ? composed.body : composed.email.text;
  const segments = composed.is === 'sms' ? countSegments(body).segments : 0;
  const words = { toAddress: to, body, segments };
  if (!(await writeWhileHeld(db, { ...message, others: [] }, words))) return;
  const others = eachAlone(message.others);
  for (const other of others) {
    const leftOut = composed.leftOut?.find(({ id }) => id === other.id);
    if (leftOut) await writeWhileHeld(db, other, { state: 'withdrawn', reason: leftOut.reason });
    else await writeWhileHeld(db, other, { toAddress: to });
  }
  const result = await send(sending.ports, message.id, to, composed);
  const now = sending.now();
  if (!result.ok) return writeRefusal(db, message, result.refusal, now);
  const { providerId } = result;
  await writeSent(db, message, { providerId, state: 'sent', at: now });
}

function send(
  ports: Sending['ports'],
  idempotencyKey: string,
  to: string,
  composed: Extract<Composed, { is: 'sms' | 'email' }>,
) {
  if (composed.is === 'email') return ports.email.send({ to, idempotencyKey, ...composed.email });
  const statusCallback = `${env().publicUrl}${apiPaths.smsStatusWebhook()}`;
  return ports.sms.send({ to, body: composed.body, statusCallback, idempotencyKey });
}
