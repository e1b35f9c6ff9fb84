import type { FitRules } from '@/lib/contracts/shop-rules';
import { figureWords } from '@/lib/measure/explain';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { formatLength } from '@/lib/units/format-length';
import { roundBlankUp, roundOpeningDown } from '@/lib/units/round';

type Steps = Pick<FitRules, 'unit' | 'stepMm'>;

/** A figure ready to be shown: `2 1/2"` and `1/16"`, with its U rounded up. */
export type FigureText = { value: string; surely: string };

/**
 * A figure in the shop's unit and step, rounded the way its kind asks for.
 *
 * Edge: U is never shown smaller than it is; an angle and a lean are shown to a tenth.
 * Example: a blank of 63.1 mm in a shop of 1/16 in is `2 1/2"`; an opening of the same size `2 7/16"`.
 */
export function figureText(figure: FitFigure, rules: Steps): FigureText {
  const { measure } = figureWords[figure.kind];
  if (measure === 'angle')
    return { value: `${tenth(figure.value)}°`, surely: `${tenthUp(figure.U)}°` };
  if (measure === 'slope') {
    return { value: `${tenth(figure.value)} mm/m`, surely: `${tenthUp(figure.U)} mm/m` };
  }
  return {
    value: formatLength(roundedMm(figure, rules.stepMm), rules),
    surely: formatLength(upTo(figure.U, rules.stepMm), rules),
  };
}

/** A length of the fit on the shop's step, up or down as its kind asks for. */
export function roundedMm(figure: FitFigure, stepMm: number): number {
  const { rounding } = figureWords[figure.kind];
  if (rounding === 'up') return upTo(figure.value, stepMm);
  return rounding === 'down' ? roundOpeningDown(figure.value + fitStepMm, stepMm) : figure.value;
}

/** Figures of a fit are kept to 1e-4 mm: what was on a mark may have left it by half of that. */
const fitStepMm = 1e-4;
const upTo = (mm: number, stepMm: number) => roundBlankUp(mm - fitStepMm, stepMm);

const tenth = (value: number) => (Math.round(value * 10) / 10 || 0).toFixed(1).replace('-', '−');
const tenthUp = (value: number) => (Math.ceil(value * 10 - 1e-9) / 10).toFixed(1);
