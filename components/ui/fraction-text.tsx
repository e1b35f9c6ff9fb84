/** An inch figure taken apart; the fraction in lowest terms, numerator 0 when there is none. */
export type FractionParts = {
  isNegative: boolean;
  whole: number;
  numerator: number;
  denominator: number;
};

/** The figure as it is drawn: whole, then a true fraction. Not for screen readers; see LengthText. */
export function FractionText({ isNegative, whole, numerator, denominator }: FractionParts) {
  const showsWhole = whole !== 0 || numerator === 0;
  return (
    <span aria-hidden="true" className="whitespace-nowrap">
      {isNegative ? '−' : ''}
      {showsWhole ? whole : ''}
      {numerator === 0 ? null : (
        <span className={`diagonal-fractions ${showsWhole ? 'ml-[0.18em]' : ''}`}>
          {numerator}⁄{denominator}
        </span>
      )}
    </span>
  );
}
