import { cornerAngle, cornerOffset } from '@/lib/measure/corner';
import type { Figure } from '@/lib/measure/figure';
import type { Share } from '@/lib/measure/fit-figure';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import type { Problem } from '@/lib/problem';
import type { LengthUnit } from '@/lib/units/brands';
import type { LengthKind } from '@/lib/units/length-limits';
import { parseLength } from '@/lib/units/parse-length';
import { checkTape } from './check-tools';
import { shareOf } from './share-of';

export const cornerFields = ['legLeft', 'legRight', 'diagonal', 'depth'] as const;
export type CornerField = (typeof cornerFields)[number];
/** As typed. */
export type CornerText = Record<CornerField, string>;

export type CornerCheck = {
  errors: Partial<Record<CornerField, string>>;
  /** What else is wrong with the three together, or to be taken with care. */
  notes: string[];
  result: CornerResult | null;
};

export type CornerResult = {
  mm: Record<CornerField, number>;
  theta: Figure;
  /** Mark to mark as read, less what a square corner would read. */
  offSquareMm: number;
  squareMm: number;
  /** Positive: the left wall is in the way at the front. Null where the corner is no square one. */
  offset: Figure | null;
  share: Share;
  limitMm: number;
  /** What a filler at a wall is asked to keep at its narrowest. */
  leastFillerMm: number;
};

/** Past this the corner is a bay or a splay and was never meant to be square. */
const squareWithinDeg = 30;

const kinds: Record<CornerField, LengthKind> = {
  legLeft: 'leg',
  legRight: 'leg',
  diagonal: 'corner-diagonal',
  depth: 'depth',
};

/** Four lengths as typed → the corner, how sure, and what it does over the depth of a base. */
export function checkCorner(text: CornerText, unit: LengthUnit): CornerCheck {
  const errors: CornerCheck['errors'] = {};
  const mm = { legLeft: 0, legRight: 0, diagonal: 0, depth: 0 };
  for (const field of cornerFields) {
    const { value, problems } = parseLength(text[field], { unit, kind: kinds[field] });
    if (value === null) errors[field] = problems[0]?.message;
    else mm[field] = value;
  }
  if (Object.keys(errors).length > 0) return { errors, notes: [], result: null };

  const tape = checkTape(unit);
  const read = (field: CornerField, boundedEnds: 0 | 1) => ({
    id: field,
    value: mm[field],
    u: lengthUncertainty(tape, mm[field], boundedEnds),
  });
  const angle = cornerAngle({
    method: 'legs',
    legLeft: read('legLeft', 1),
    legRight: read('legRight', 1),
    diagonal: read('diagonal', 0),
    carriedPast: false,
    uOfLength: (lengthMm) => lengthUncertainty(tape, lengthMm, 1),
  });
  const notes = angle.problems.map(({ message }: Problem) => message);
  if (!angle.value) return { errors, notes, result: null };

  const theta = angle.value;
  const isSquare = Math.abs(theta.value - 90) <= squareWithinDeg;
  const offset = isSquare ? cornerOffset(theta, mm.depth).value : null;
  const { fit } = defaultShopRules(unit === 'in' ? 'US' : 'UK');
  // The shop's starting rule is for one depth; it is carried to another in proportion.
  const limitMm = (fit.cornerFlagMm * mm.depth) / fit.cornerFlagOverMm;
  const { fillerLeastMm: leastFillerMm } = fit;
  const squareMm = Math.hypot(mm.legLeft, mm.legRight);
  const share = offset ? shareOf(offset, limitMm) : 'within';
  const offSquareMm = mm.diagonal - squareMm;
  return {
    errors,
    notes,
    result: { mm, theta, squareMm, offSquareMm, offset, share, limitMm, leastFillerMm },
  };
}
