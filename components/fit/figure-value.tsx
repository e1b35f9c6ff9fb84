import { LengthText } from '@/components/ui/length-text';
import { PlusMinus } from '@/components/ui/plus-minus';
import { figureWords } from '@/lib/measure/explain';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { figureText, roundedMm } from '@/lib/sheet/figure-text';
import type { Steps } from './figures';

/** A figure as it is read: a length set like a dimension, an angle or a slope with its unit. */
export function FigureValue({
  figure,
  rules,
  showsUnit = false,
}: {
  figure: FitFigure;
  rules: Steps;
  showsUnit?: boolean;
}) {
  if (figureWords[figure.kind].measure !== 'length') {
    return <span className="whitespace-nowrap">{figureText(figure, rules).value}</span>;
  }
  return (
    <LengthText
      mm={roundedMm(figure, rules.stepMm)}
      unit={rules.unit}
      stepMm={rules.stepMm}
      showsUnit={showsUnit}
    />
  );
}

/** How sure it is: ± U, rounded up. */
export function SurelyValue({ figure, rules }: { figure: FitFigure; rules: Steps }) {
  // An end that the shop sets, such as the least filler beside an open end, is what it is set to.
  if (figure.U === 0) return <span className="whitespace-nowrap text-graphite">as set</span>;
  if (figureWords[figure.kind].measure !== 'length') {
    return (
      <span className="whitespace-nowrap text-graphite">± {figureText(figure, rules).surely}</span>
    );
  }
  return <PlusMinus uMm={Math.max(0, figure.U - 1e-4)} unit={rules.unit} stepMm={rules.stepMm} />;
}
