import { and, eq, inArray, type SQL } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/database';
import { customers, messages } from '@/db/schema';
import { occasionWords, parseOccasion } from '@/lib/messages/occasions';
import type { EmailRefusal } from '@/server/ports/email/email-port';
import type { SmsRefusal } from '@/server/ports/sms/sms-port';
import { changeConsent } from './change-consent';
import { putItem } from './scheduler-items';

export type WhyGivenUp = {
  /** In words for the scheduler. */
  message: string;
  code: SmsRefusal['code'] | EmailRefusal['code'] | null;
  providerId?: string;
};

/**
 * Gives messages up for good, and in the same transaction puts them before the scheduler, ends texts to a
 * number that said STOP at the provider, and remembers a number that takes none. What somebody else has
 * settled meanwhile is not among `which`, and stays as it is.
 */
export async function giveUp(
  db: Database,
  which: SQL | undefined,
  why: WhyGivenUp,
  now: Date,
): Promise<void> {
  const { message, code, providerId } = why;
  await db.transaction(async (tx) => {
    const given = await tx
      .update(messages)
      .set({
        state: 'refused',
        reason: callThem(message),
        askAt: null,
        ...(providerId ? { providerId } : {}),
      })
      .where(which)
      .returning(givenUpFields);
    const ids = new Set(given.map(({ id }) => id));
    for (const row of given) {
      // Told in one message, it is one thing to do.
      if (row.toldWith && ids.has(row.toldWith)) continue;
      await putBeforeScheduler(tx, row, message, now);
      if (code === 'opted-out') await writeOptOut(tx, row, now);
      if (code === 'cannot-receive' || code === 'bad-number') await rememberNumber(tx, row);
    }
  });
}

export function callThem(why: string): string {
  return `Not delivered: call them. ${why}`;
}

const givenUpFields = {
  id: messages.id,
  shopId: messages.shopId,
  customerId: messages.customerId,
  jobId: messages.jobId,
  visitId: messages.visitId,
  occasion: messages.occasion,
  channel: messages.channel,
  key: messages.key,
  toAddress: messages.toAddress,
  toldWith: messages.toldWith,
};
type GivenUp = { [Field in keyof typeof givenUpFields]: (typeof messages.$inferSelect)[Field] };

async function putBeforeScheduler(
  tx: Transaction,
  row: GivenUp,
  why: string,
  now: Date,
): Promise<void> {
  const { shopId, customerId, jobId, visitId } = row;
  const occasion = parseOccasion(row.occasion);
  const what = occasion ? occasionWords[occasion] : 'Written by hand';
  const by = row.channel === 'sms' ? 'text' : 'e-mail';
  const other = (await otherWayWent(tx, row)) ? ' The other way went out.' : '';
  await putItem(tx, {
    shopId,
    customerId,
    jobId,
    visitId,
    kind: 'not-delivered',
    key: `not-delivered:${row.id}`,
    words: `${what}: the ${by} was not delivered. ${why}${other}`,
    at: now,
  });
}

/** The same note by the other channel is on its way, or there. */
async function otherWayWent(tx: Transaction, row: GivenUp): Promise<boolean> {
  const otherKey = row.key.replace(/:(sms|email)$/, row.channel === 'sms' ? ':email' : ':sms');
  if (otherKey === row.key) return false;
  const [other] = await tx
    .select({ id: messages.id })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, row.shopId),
        eq(messages.key, otherKey),
        inArray(messages.state, ['waiting', 'sending', 'sent', 'delivered']),
      ),
    );
  return other !== undefined;
}

/** The provider knows of a STOP that we have not heard. */
async function writeOptOut(tx: Transaction, row: GivenUp, now: Date): Promise<void> {
  await changeConsent(tx, {
    shopId: row.shopId,
    customerId: row.customerId,
    channel: 'sms',
    given: false,
    how: 'said STOP, by the texting provider',
    at: now,
  });
}

/** Nothing more is texted to it; another number of the same customer may be. */
async function rememberNumber(tx: Transaction, row: GivenUp): Promise<void> {
  await tx
    .update(customers)
    .set({ untextablePhone: row.toAddress })
    .where(
      and(
        eq(customers.shopId, row.shopId),
        eq(customers.id, row.customerId),
        eq(customers.phone, row.toAddress),
      ),
    );
}
