import type { Run, Unit, UnitKind } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { exactInches as inches } from '@/lib/measure/rules/exact-inches';

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
    wall: [wallFootMm, wallFootMm + (isInches ? inches(30) : 720)],
    tall: [rules.kickHeightMm, isInches ? inches(84) : 2_100],
  } as const;
  const depth = {
    base: [inches(24), 560],
    wall: [inches(12), 300],
    tall: [inches(24), 560],
  } as const;
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
const usual: Record<UnitKind, { inInches: number; mm: number; isFixed: boolean }> = {
  base: { inInches: 24, mm: 600, isFixed: false },
  drawers: { inInches: 24, mm: 600, isFixed: false },
  sink: { inInches: 36, mm: 800, isFixed: false },
  corner: { inInches: 36, mm: 900, isFixed: true },
  wall: { inInches: 24, mm: 600, isFixed: false },
  tall: { inInches: 24, mm: 600, isFixed: false },
  panel: { inInches: 0.75, mm: 18, isFixed: true },
  dishwasher: { inInches: 24, mm: 600, isFixed: true },
  range: { inInches: 30, mm: 600, isFixed: true },
  refrigerator: { inInches: 36, mm: 900, isFixed: true },
  hood: { inInches: 30, mm: 600, isFixed: true },
  open: { inInches: 12, mm: 300, isFixed: false },
};

export function newUnit(rules: FitRules, unit: { id: string; kind: UnitKind }): Unit {
  const { inInches, mm, isFixed } = usual[unit.kind];
  const widthMm = rules.unit === 'in' ? inches(inInches) : mm;
  return {
    ...unit,
    name: '',
    widthMm,
    alterable: isFixed ? null : alterableAbout(widthMm, rules),
    ...(unit.kind === 'panel' ? { sheets: 1 } : {}),
  };
}

/** Six inches (150 mm) either way in steps of three (50 mm); never under six inches (150 mm). */
export function alterableAbout(widthMm: number, rules: FitRules): NonNullable<Unit['alterable']> {
  const [reachMm, stepMm] = rules.unit === 'in' ? [inches(6), inches(3)] : [150, 50];
  return { minMm: Math.max(reachMm, widthMm - reachMm), maxMm: widthMm + reachMm, stepMm };
}
