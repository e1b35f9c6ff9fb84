import { withFractions } from '@/components/ui/with-fractions';

/** A sentence with its fractions set as fractions; a screen reader hears it as it is written. */
export function InFractions({ words }: { words: string }) {
  return withFractions(words, ({ all, whole, numerator, denominator }) => (
    <>
      <span className="sr-only">{all}</span>
      <span aria-hidden="true" className="whitespace-nowrap">
        {whole}
        <span className={`diagonal-fractions ${whole ? 'ml-[0.18em]' : ''}`}>
          {numerator}⁄{denominator}
        </span>
      </span>
    </>
  ));
}
