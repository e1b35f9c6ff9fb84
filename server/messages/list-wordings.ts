import { eq } from 'drizzle-orm';
import { messageWordings } from '@/db/schema';
import type { WordingsView } from '@/lib/contracts/wordings';
import { occasions, parseOccasion } from '@/lib/messages/occasions';
import { usualWording } from '@/lib/messages/render-message';
import { languages } from '@/lib/time/text-locale';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readMessageSettings } from './message-settings';
import { ownParts } from './read-wording';

/** What the shop says on every occasion in every language: its own words, else ours. */
export async function listWordings(ctx: PersonContext): Promise<WordingsView> {
  mustBeAllowed(ctx, 'messages:read');
  const own = await ctx.db
    .select({
      occasion: messageWordings.occasion,
      language: messageWordings.language,
      sms: messageWordings.sms,
      subject: messageWordings.subject,
      email: messageWordings.email,
    })
    .from(messageWordings)
    .where(eq(messageWordings.shopId, ctx.shop.id));
  const wordings = languages.flatMap((language) =>
    occasions.map((occasion) => {
      const row = own.find((each) => each.occasion === occasion && each.language === language);
      const parts = row ? ownParts(row) : {};
      const isOwn = Object.keys(parts).length > 0;
      return { occasion, language, ...usualWording(occasion, language), ...parts, isOwn };
    }),
  );
  const { silentOn, ...settings } = await readMessageSettings(ctx.db, ctx.shop.id);
  const known = silentOn.flatMap((occasion) => parseOccasion(occasion) ?? []);
  return { wordings, settings: { ...settings, silentOn: known } };
}
