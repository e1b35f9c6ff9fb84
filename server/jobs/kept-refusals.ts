import { createHmac } from 'node:crypto';
import { and, desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { consents, customers, keptRefusals } from '@/db/schema';
import { signingSecret } from '@/server/base/secret';

type Channel = 'sms' | 'email';
type Addresses = { phone: string; email: string };

/** Keyed, so that the few thousand million phone numbers there are cannot be tried against the database alone. */
function hashOf(channel: Channel, address: string): string {
  return createHmac('sha256', signingSecret())
    .update(`refusal:${channel}:${address.toLowerCase()}`)
    .digest('base64url');
}

const known = ({ phone, email }: Addresses) =>
  [
    { channel: 'sms' as const, address: phone },
    { channel: 'email' as const, address: email },
  ].filter(({ address }) => address !== '');

/** A refusal that must hold after its customer is forgotten. */
export async function keepRefusal(
  tx: Transaction,
  of: { shopId: string; channel: Channel; address: string; at: Date },
): Promise<void> {
  const { shopId, channel, address, at } = of;
  await tx
    .insert(keptRefusals)
    .values({ shopId, channel, addressHash: hashOf(channel, address), at })
    .onConflictDoNothing();
}

/**
 * The channels that somebody at these addresses refused before, under whatever name they call now: one who
 * was erased, or another customer of the shop with that number, whose last word on texts was no.
 */
export async function refusedBefore(
  tx: Transaction,
  shopId: string,
  addresses: Addresses,
): Promise<Set<Channel>> {
  const refused = new Set<Channel>();
  for (const { channel, address } of known(addresses)) {
    const [kept] = await tx
      .select({ id: keptRefusals.id })
      .from(keptRefusals)
      .where(
        and(
          eq(keptRefusals.shopId, shopId),
          eq(keptRefusals.channel, channel),
          eq(keptRefusals.addressHash, hashOf(channel, address)),
        ),
      );
    if (kept || (channel === 'sms' && (await saidStop(tx, shopId, address)))) refused.add(channel);
  }
  return refused;
}

async function saidStop(tx: Transaction, shopId: string, phone: string): Promise<boolean> {
  const [last] = await tx
    .select({ given: consents.given })
    .from(consents)
    .innerJoin(customers, eq(customers.id, consents.customerId))
    .where(
      and(eq(consents.shopId, shopId), eq(consents.channel, 'sms'), eq(customers.phone, phone)),
    )
    .orderBy(desc(consents.sequence))
    .limit(1);
  return last?.given === false;
}
