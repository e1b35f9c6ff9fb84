import { eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messageSettings } from '@/db/schema';

export type MessageSettings = {
  /** Occasions on which the shop tells nothing. */
  silentOn: string[];
  /** What one message of a text costs, in `currency`; null: not known. */
  segmentPrice: number | null;
  currency: string;
};

export async function readMessageSettings(db: Database, shopId: string): Promise<MessageSettings> {
  const [settings] = await db
    .select({
      silentOn: messageSettings.silentOn,
      segmentPrice: messageSettings.segmentPrice,
      currency: messageSettings.currency,
    })
    .from(messageSettings)
    .where(eq(messageSettings.shopId, shopId));
  return settings ?? { silentOn: [], segmentPrice: null, currency: 'USD' };
}
