import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { consents, customers } from '@/db/schema';
import { type ChannelDecision, channelsFor } from '@/lib/messages/consent';
import { toE164 } from '@/lib/messages/phone-number';

export type Recipient = {
  customerId: string;
  name: string;
  phone: string;
  email: string;
  language: 'en' | 'es';
  decision: ChannelDecision;
};

/** A customer, and on which channels they may be told now. */
export async function readRecipient(
  db: Database,
  shopId: string,
  customerId: string,
): Promise<Recipient> {
  const [customer] = await db
    .select({
      name: customers.name,
      phone: customers.phone,
      email: customers.email,
      language: customers.language,
      untextablePhone: customers.untextablePhone,
    })
    .from(customers)
    .where(and(eq(customers.shopId, shopId), eq(customers.id, customerId)));
  if (!customer) throw new Error(`there is no customer ${customerId}`);
  const said = await db
    .select({
      channel: consents.channel,
      given: consents.given,
      at: consents.at,
      sequence: consents.sequence,
    })
    .from(consents)
    .where(and(eq(consents.shopId, shopId), eq(consents.customerId, customerId)))
    .orderBy(asc(consents.sequence));
  const { untextablePhone, ...known } = customer;
  const { phone, email } = known;
  const decision = channelsFor({
    consents: said,
    phone,
    email,
    phoneTakesTexts: takesTexts(phone) && phone !== untextablePhone,
  });
  return { customerId, ...known, decision };
}

/** What is kept is E.164, so the region does not matter; only a number known for a landline does not. */
function takesTexts(phone: string): boolean {
  return toE164(phone, 'EU').value?.takesTexts !== 'no';
}
