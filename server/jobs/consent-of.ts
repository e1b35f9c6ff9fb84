import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { consents } from '@/db/schema';

export type Consent = { sms: boolean; email: boolean };

/** What each customer allows now: the newest row of each channel holds; none given is none. */
export async function consentOf(
  db: Database,
  shopId: string,
  customerIds: string[],
): Promise<Map<string, Consent>> {
  const allowed = new Map<string, Consent>();
  if (customerIds.length === 0) return allowed;
  const newest = await db
    .selectDistinctOn([consents.customerId, consents.channel], {
      customerId: consents.customerId,
      channel: consents.channel,
      given: consents.given,
    })
    .from(consents)
    .where(and(eq(consents.shopId, shopId), inArray(consents.customerId, customerIds)))
    .orderBy(consents.customerId, consents.channel, desc(consents.sequence));
  for (const { customerId, channel, given } of newest) {
    const known = allowed.get(customerId) ?? { sms: false, email: false };
    allowed.set(customerId, { ...known, [channel]: given });
  }
  return allowed;
}
