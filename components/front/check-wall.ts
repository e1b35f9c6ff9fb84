import type { Share } from '@/lib/measure/fit-figure';
import { type Plumb, plumbOf } from '@/lib/measure/plumb';
import type { ProfilePoint } from '@/lib/measure/profile';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { type Straightness, straightness } from '@/lib/measure/straightness';
import { lengthOwnPart, slopeUncertainty } from '@/lib/measure/uncertainty';
import type { LengthUnit } from '@/lib/units/brands';
import { parseLength } from '@/lib/units/parse-length';
import { checkLevel } from './check-tools';
import { shareOf } from './share-of';

/** along: a straightedge laid on the wall. up: a level stood plumb against it. */
export type WallWay = 'along' | 'up';

export type WallText = {
  way: WallWay;
  /** From one place to the next. */
  spacing: string;
  /** Gap behind the straightedge at each place; empty where none was read. */
  gaps: string[];
};

export type WallResult = {
  points: ProfilePoint[];
  lengthMm: number;
  straight: Straightness;
  /** Only of a level stood plumb. */
  plumb: Plumb | null;
  straightShare: Share;
  plumbShare: Share;
  limitMm: number;
};

export type WallCheck = {
  spacingError?: string;
  gapErrors: (string | undefined)[];
  notes: string[];
  result: WallResult | null;
};

/** Gaps to a straightedge as typed → how straight the wall is and, stood plumb, how it leans. */
export function checkWall(text: WallText, unit: LengthUnit): WallCheck {
  const spacing = parseLength(text.spacing, { unit, kind: 'depth' });
  const gaps = text.gaps.map((gap) =>
    gap.trim() === '' ? null : parseLength(gap, { unit, kind: 'gap' }),
  );
  const spacingError = spacing.value === null ? spacing.problems[0]?.message : undefined;
  const gapErrors = gaps.map((gap) => (gap?.value === null ? gap.problems[0]?.message : undefined));
  if (spacing.value === null || gapErrors.some(Boolean)) {
    return { spacingError, gapErrors, notes: [], result: null };
  }
  const level = checkLevel(unit);
  const u = lengthOwnPart(level);
  const spacingMm = spacing.value;
  const points = gaps.flatMap((gap, at) =>
    gap?.value === null || gap?.value === undefined
      ? []
      : [{ id: `gap-${at}`, atMm: at * spacingMm, sMm: -gap.value, u }],
  );
  const straight = straightness(points);
  const lengthMm = (points.at(-1)?.atMm ?? 0) - (points[0]?.atMm ?? 0);
  const uReference = slopeUncertainty(level);
  const plumb = text.way === 'up' ? plumbOf({ points, uReference, overMm: lengthMm }) : null;
  const notes = [...straight.problems, ...(plumb?.problems ?? [])].map(({ message }) => message);
  if (!straight.value) return { gapErrors, notes, result: null };

  const limitMm = defaultShopRules(unit === 'in' ? 'US' : 'UK').fit.plumbFlagMm;
  const result = {
    points,
    lengthMm,
    straight: straight.value,
    plumb: plumb?.value ?? null,
    straightShare: shareOf(straight.value.minimumZone, limitMm),
    plumbShare: plumb?.value ? shareOf(plumb.value.over, limitMm) : ('within' as const),
    limitMm,
  };
  return { gapErrors, notes, result };
}
