import { and, eq } from 'drizzle-orm';
import { messageWordings } from '@/db/schema';
import type { SaveWordingInput } from '@/lib/contracts/wordings';
import { checkTemplate } from '@/lib/messages/check-template';
import { isTextAnswer, occasionWords } from '@/lib/messages/occasions';
import { usualWording } from '@/lib/messages/render-message';
import { type WordingPart, wordingParts } from '@/lib/messages/template';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';

/** The shop's own words; a part that is empty or says what we say is left to us, and follows our changes. */
export async function saveWording(ctx: PersonContext, input: SaveWordingInput): Promise<void> {
  mustBeAllowed(ctx, 'shop:change');
  const { occasion, language } = input;
  const own = ownWords(input);
  mustBeSendable(input, own);
  const isEmpty = wordingParts.every((part) => own[part] === '');
  await ctx.db.transaction(async (tx) => {
    await tx
      .delete(messageWordings)
      .where(
        and(
          eq(messageWordings.shopId, ctx.shop.id),
          eq(messageWordings.occasion, occasion),
          eq(messageWordings.language, language),
        ),
      );
    if (!isEmpty) {
      const row = { shopId: ctx.shop.id, occasion, language, ...own, changedAt: ctx.now };
      await tx.insert(messageWordings).values(row);
    }
    await writeAudit(tx, ctx, {
      verb: 'save-wording',
      subjectKind: 'person',
      subjectId: ctx.actor.personId,
      summary: `Words for "${occasionWords[occasion]}" in ${language === 'es' ? 'Spanish' : 'English'} ${isEmpty ? 'left to Setwell' : 'changed'}`,
      detail: { occasion, language, ...own },
    });
  });
}

function ownWords(input: SaveWordingInput): Record<WordingPart, string> {
  const usual = usualWording(input.occasion, input.language);
  const textOnly = isTextAnswer(input.occasion);
  const own = (part: WordingPart) => {
    if (part !== 'sms' && textOnly) return '';
    return input[part] === usual[part].trim() ? '' : input[part];
  };
  return { sms: own('sms'), subject: own('subject'), email: own('email') };
}

/** Refused when saved, not when sent. Warnings are shown as it is written, and hold nothing up. */
function mustBeSendable(input: SaveWordingInput, own: Record<WordingPart, string>): void {
  const { occasion, language } = input;
  const errors: Record<string, string> = {};
  for (const part of wordingParts) {
    if (own[part] === '') continue;
    const wrong = checkTemplate(own[part], { occasion, part, language }).find(
      ({ severity }) => severity === 'error',
    );
    if (wrong) errors[part] = wrong.message;
  }
  if (Object.keys(errors).length === 0) return;
  throw new Refusal({
    status: 422,
    code: 'wording-not-sendable',
    message: 'Not saved: it could not be sent like this. What you wrote is still here.',
    errors,
  });
}
