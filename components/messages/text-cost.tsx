import { plainSms } from '@/lib/messages/plain-sms';
import { countSegments } from '@/lib/messages/segments';
import { textCostWords } from '@/lib/messages/text-cost';

/** In how many messages a text goes out, at what price, and which letter makes it dear. */
export function TextCost({
  text,
  price = null,
}: {
  text: string;
  price?: { perSegment: number; currency: string } | null;
}) {
  const { segments, encoding, culprits } = countSegments(plainSms(text));
  return (
    <p aria-live="polite" className={`text-note ${segments > 2 ? 'text-chalk' : 'text-graphite'}`}>
      {text === '' ? null : textCostWords(segments, price)}
      {encoding === 'UCS-2'
        ? `; ${culprits.map(({ character, code }) => `${character} (${code})`).join(', ')} leaves room for 70 letters a message, not 160`
        : ''}
    </p>
  );
}
