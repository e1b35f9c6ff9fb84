import { messageSettings } from '@/db/schema';
import type { SaveMessageSettingsInput } from '@/lib/contracts/wordings';
import { maySilence, occasionWords } from '@/lib/messages/occasions';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** On which occasions the shop keeps silent, and what a text costs it. Answers to a customer are always given. */
export async function saveMessageSettings(
  ctx: PersonContext,
  input: SaveMessageSettingsInput,
): Promise<void> {
  mustBeAllowed(ctx, 'shop:change');
  const silentOn = [...new Set(input.silentOn)].filter(maySilence);
  const { segmentPrice, currency } = input;
  const settings = { silentOn, segmentPrice, currency };
  await ctx.db.transaction(async (tx) => {
    await tx
      .insert(messageSettings)
      .values({ shopId: ctx.shop.id, ...settings })
      .onConflictDoUpdate({ target: messageSettings.shopId, set: settings });
    const silent = silentOn.map((occasion) => occasionWords[occasion]).join(', ');
    await writeAudit(tx, ctx, {
      verb: 'save-message-settings',
      subjectKind: 'person',
      subjectId: ctx.actor.personId,
      summary: silent
        ? `Customers are not told: ${silent}`
        : 'Customers are told on every occasion',
      detail: settings,
    });
  });
}
