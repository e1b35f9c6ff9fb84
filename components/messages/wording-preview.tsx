import type { Occasion } from '@/lib/messages/occasions';
import { isTextAnswer } from '@/lib/messages/occasions';
import { renderEmail, renderSms } from '@/lib/messages/render-message';
import { sampleValues } from '@/lib/messages/sample-values';
import type { Wording } from '@/lib/messages/template';
import type { Language } from '@/lib/time/text-locale';
import { TextCost } from './text-cost';

type Props = {
  occasion: Occasion;
  language: Language;
  draft: Wording;
  shop: { name: string; phone: string };
  price: { perSegment: number; currency: string } | null;
};

/** The message as a customer would get it, with an invented visit of long names, and its cost. */
export function WordingPreview({ occasion, language, draft, shop, price }: Props) {
  const values = { ...sampleValues[language], shop: shop.name, shopPhone: shop.phone };
  const input = { occasion, language, values, ownWording: draft };
  const sms = renderSms(input);
  const email = renderEmail(input).value;
  return (
    <section aria-label="Preview" lang={language} className="flex flex-col gap-3">
      <div>
        <p className="rounded border border-rule bg-tint px-3 py-2 break-words whitespace-pre-line">
          {sms.value ?? sms.problems[0]?.message}
        </p>
        {sms.value === null ? null : <TextCost text={sms.value} price={price} />}
      </div>
      {isTextAnswer(occasion) || !email ? null : (
        <div className="border border-rule bg-sheet px-4 py-3">
          <p className="border-b border-rule pb-1 font-bold">{email.subject}</p>
          <p className="pt-2 break-words whitespace-pre-line">{email.text}</p>
        </div>
      )}
    </section>
  );
}
