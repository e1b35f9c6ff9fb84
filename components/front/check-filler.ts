import type { Figure } from '@/lib/measure/figure';
import { figure } from '@/lib/measure/figure';
import type { Share } from '@/lib/measure/fit-figure';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { type ScribeAllowance, scribeAllowance } from '@/lib/measure/scribe';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import type { LengthUnit } from '@/lib/units/brands';
import { parseLength } from '@/lib/units/parse-length';
import { roundBlankUp } from '@/lib/units/round';
import { checkTape } from './check-tools';

export const fillerFields = ['top', 'middle', 'bottom'] as const;
export type FillerField = (typeof fillerFields)[number];
/** As typed: the gap from the plumb last cabinet to the wall. */
export type FillerText = Record<FillerField, string>;

export type FillerResult = {
  mm: Record<FillerField, number>;
  /** Width of the piece as it leaves the saw, before it is scribed. */
  blankMm: number;
  scribe: ScribeAllowance;
  /** Top less bottom. */
  taper: Figure;
  share: Share;
  words: string;
  leastMm: number;
};

export type FillerCheck = {
  errors: Partial<Record<FillerField, string>>;
  notes: string[];
  result: FillerResult | null;
};

/** Three widths as typed → the blank to cut, its taper, and what the scribe takes off. */
export function checkFiller(text: FillerText, unit: LengthUnit): FillerCheck {
  const errors: FillerCheck['errors'] = {};
  const mm = { top: 0, middle: 0, bottom: 0 };
  for (const field of fillerFields) {
    const { value, problems } = parseLength(text[field], { unit, kind: 'unit-width' });
    if (value === null) errors[field] = problems[0]?.message;
    else mm[field] = value;
  }
  if (Object.keys(errors).length > 0) return { errors, notes: [], result: null };

  const { fit } = defaultShopRules(unit === 'in' ? 'US' : 'UK');
  const tape = checkTape(unit);
  const places = fillerFields.map((field, at) => ({
    id: field,
    atMm: at * 400,
    gapMm: mm[field],
    u: lengthUncertainty(tape, mm[field], 1),
  }));
  const { value: scribe, problems } = scribeAllowance({
    places,
    uShared: 0,
    held: 'by-size',
    rules: { marginMm: fit.scribeMarginMm, leastMm: fit.scribeLeastMm, stepMm: fit.scribeStepMm },
  });
  const notes = problems.map(({ message }) => message);
  if (!scribe) return { errors, notes, result: null };

  const uEnd = (field: FillerField) => lengthUncertainty(tape, mm[field], 1);
  const taper = figure(mm.top - mm.bottom, Math.hypot(uEnd('top'), uEnd('bottom')), [
    'top',
    'bottom',
  ]);
  const blankMm = roundBlankUp(scribe.least.gapMm + scribe.unrounded.value, fit.scribeStepMm);
  const { fillerLeastMm: leastMm, fillerMostMm: mostMm } = fit;
  const verdict = judge(scribe.least.gapMm, scribe.greatest.gapMm, { leastMm, mostMm });
  return { errors, notes, result: { mm, blankMm, scribe, taper, leastMm, ...verdict } };
}

function judge(
  narrowMm: number,
  wideMm: number,
  { leastMm, mostMm }: { leastMm: number; mostMm: number },
): Pick<FillerResult, 'share' | 'words'> {
  if (narrowMm < leastMm) {
    return {
      share: 'over',
      words: 'Narrower than a filler wants to be: a door beside it may bind.',
    };
  }
  if (wideMm > mostMm) {
    return { share: 'close', words: 'Wider than stock: cut it from a panel, or widen a unit.' };
  }
  return { share: 'within', words: 'A filler of a usual width.' };
}
