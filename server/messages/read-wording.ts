import { and, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messageWordings } from '@/db/schema';
import type { Occasion } from '@/lib/messages/occasions';
import { type Wording, wordingParts } from '@/lib/messages/template';
import type { Language } from '@/lib/time/text-locale';

/** The shop's own words for an occasion; a part that it leaves to us is not there. */
export async function readOwnWording(
  db: Database,
  shopId: string,
  of: { occasion: Occasion; language: Language },
): Promise<Partial<Wording>> {
  const [own] = await db
    .select({
      sms: messageWordings.sms,
      subject: messageWordings.subject,
      email: messageWordings.email,
    })
    .from(messageWordings)
    .where(
      and(
        eq(messageWordings.shopId, shopId),
        eq(messageWordings.occasion, of.occasion),
        eq(messageWordings.language, of.language),
      ),
    );
  return own ? ownParts(own) : {};
}

export function ownParts(own: Wording): Partial<Wording> {
  return Object.fromEntries(
    wordingParts.filter((part) => own[part] !== '').map((part) => [part, own[part]]),
  );
}
