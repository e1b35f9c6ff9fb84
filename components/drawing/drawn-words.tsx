import { withFractions } from '@/components/ui/with-fractions';

/** Words of a drawing with their fractions set as fractions: "blank 2 1/2" has a true half. */
export function DrawnWords({ words }: { words: string }) {
  return withFractions(words, ({ whole, numerator, denominator }) => (
    <>
      {whole}
      <tspan dx={whole ? '0.15em' : undefined} className="diagonal-fractions">
        {numerator}⁄{denominator}
      </tspan>
    </>
  ));
}
