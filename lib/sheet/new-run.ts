import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Run, Unit, UnitKind } from '@/lib/contracts/wall-book';

const inch = 25.4;

/**
 * A run to begin with: the usual depth and heights of its level under the shop's rules, no units yet.
 *
 * Edge: both ends meet the wall until said otherwise.
 * Example: a base run in a US shop is 24 in deep, from the kick at 4 in to 34 1/2 in.
 * Source: common practice (US: boxes in inches; elsewhere 560, 300 and 560 mm deep).
 */
export function newRun(
  rules: FitRules,
  run: { id: string; wallId: string; name: string; level: Run['level'] },
): Run {
  const isInches = rules.unit === 'in';
  const wallFootMm = rules.counterTopMm + rules.counterToWallUnitMm;
  const heights = {
    base: [rules.kickHeightMm, rules.baseTopMm],
    wall: [wallFootMm, wallFootMm + (isInches ? 30 * inch : 720)],
    tall: [rules.kickHeightMm, isInches ? 84 * inch : 2_100],
  } as const;
  const depth = { base: [24 * inch, 560], wall: [12 * inch, 300], tall: [24 * inch, 560] } as const;
  const [z0Mm, z1Mm] = heights[run.level];
  return {
    ...run,
    left: { kind: 'wall' },
    right: { kind: 'wall' },
    carcassDepthMm: depth[run.level][isInches ? 0 : 1],
    bumperMm: 2,
    doorMm: 19,
    z0Mm,
    z1Mm,
    units: [],
    share: { how: 'equal' },
    counterGroup: run.level === 'base' ? 'counter' : null,
  };
}

/** The width that a unit is most often built to, and whether it can be built to another. */
const usual: Record<UnitKind, { inches: number; mm: number; isFixed: boolean }> = {
  base: { inches: 24, mm: 600, isFixed: false },
  drawers: { inches: 24, mm: 600, isFixed: false },
  sink: { inches: 36, mm: 800, isFixed: false },
  corner: { inches: 36, mm: 900, isFixed: true },
  wall: { inches: 24, mm: 600, isFixed: false },
  tall: { inches: 24, mm: 600, isFixed: false },
  panel: { inches: 0.75, mm: 18, isFixed: true },
  dishwasher: { inches: 24, mm: 600, isFixed: true },
  range: { inches: 30, mm: 600, isFixed: true },
  refrigerator: { inches: 36, mm: 900, isFixed: true },
  hood: { inches: 30, mm: 600, isFixed: true },
  open: { inches: 12, mm: 300, isFixed: false },
};

export function newUnit(rules: FitRules, unit: { id: string; kind: UnitKind }): Unit {
  const { inches, mm, isFixed } = usual[unit.kind];
  const widthMm = rules.unit === 'in' ? inches * inch : mm;
  return {
    ...unit,
    name: '',
    widthMm,
    alterable: isFixed ? null : alterableAbout(widthMm, rules),
  };
}

/** Six inches (150 mm) either way in steps of three (50 mm); never under six inches (150 mm). */
export function alterableAbout(widthMm: number, rules: FitRules): NonNullable<Unit['alterable']> {
  const [reachMm, stepMm] = rules.unit === 'in' ? [6 * inch, 3 * inch] : [150, 50];
  return { minMm: Math.max(reachMm, widthMm - reachMm), maxMm: widthMm + reachMm, stepMm };
}
