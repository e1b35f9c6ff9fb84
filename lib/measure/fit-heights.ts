/** Heights that units need: tall ones to stand up, appliances under the counter, uppers over it. */
import type { Unit } from '@/lib/contracts/runs';
import { type Figure, figure } from '@/lib/measure/figure';
import type { FloorFit } from '@/lib/measure/fit';
import type { FitContext } from '@/lib/measure/fit-context';
import { type FitFigure, fitFigure } from '@/lib/measure/fit-figure';
import { type FitDatum, floorToCome } from '@/lib/measure/fit-kicks';
import type { WorkedRun } from '@/lib/measure/fit-runs';
import type { LevelLine } from '@/lib/measure/level-line';
import { counterSteps, sillOverCounter, upperGap } from '@/lib/measure/over-counter';
import type { TiltCheck } from '@/lib/measure/run-fit';
import { tiltUp } from '@/lib/measure/tilt-up';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import { underCounterHeight } from '@/lib/measure/under-counter';
import { LASER_PLANE_U } from '@/lib/measure/wall-faces';
import { type Problem, warning } from '@/lib/problem';

/** A box is lifted this far to be set on its base; from memory. */
const LIFT_MM = 10;
/** A dishwasher opening where the maker's sheet is not given: 34 1/2 − 1/4 in; 820 elsewhere. Refs F15–F24. */
const DISHWASHER_NEED_MM = { US: 869.95, UK: 820, AU: 820, EU: 820 };
/** A new top beside an old one may step this much and still be felt as one; from memory. */
const COUNTER_STEP_MM = 1.6;

/** Whether a unit of a tall run stands up under the least clear height read; null for others. */
export function tiltOf(
  context: FitContext,
  { run }: WorkedRun,
  unit: Unit,
  floor: FloorFit | null,
): TiltCheck | null {
  const isTall = unit.kind === 'tall' || run.level === 'tall';
  const clear = floor?.clearHeightLeast?.figure;
  if (!isTall || run.level === 'base' || !clear) return null;
  const toCome = floorToCome(context);
  const clearHeight = figure(
    clear.value - toCome.valueMm,
    Math.hypot(clear.u, toCome.u),
    clear.from,
  );
  const tilted = tiltUp({
    unit: {
      heightMm: run.z1Mm - run.z0Mm,
      widthMm: unit.widthMm,
      depthMm: run.carcassDepthMm,
      kickMm: Math.max(0, run.z0Mm),
      kickComesOff: true,
    },
    clearWhereTilted: clearHeight,
    clearWhereItStands: clearHeight,
    marginMm: context.rules.tiltMarginMm,
    liftMm: LIFT_MM,
  }).value;
  if (!tilted) return null;
  const { tiltMargin, standMargin, helps } = tilted;
  const least = tiltMargin.value <= standMargin.value ? tiltMargin : standMargin;
  return {
    standsUp: tilted.standsUp,
    margin: fitFigure('tilt-height', least),
    words: [tilted.words, ...helps.slice(0, 1)].join(' '),
  };
}

/**
 * Clear height under the counter where an appliance stands, against the maker’s need.
 * Edge: null where nobody gave a need (dishwashers have a usual one) or the floor is not read.
 */
export function applianceHeight(
  context: FitContext,
  level: LevelLine,
  { run, plane, filled }: WorkedRun,
  unit: Unit,
  datum: FitDatum | null,
): { height: FitFigure | null; problems: Problem[] } {
  const placed = filled?.placed.find(({ id }) => id === unit.id);
  const needMm =
    unit.needHeightMm ??
    (unit.kind === 'dishwasher' ? DISHWASHER_NEED_MM[context.rules.region] : null);
  const drops = level.drops.filter(({ wallId }) => wallId === run.wallId);
  if (needMm === null || run.level !== 'base' || !placed || !datum || drops.length === 0) {
    return { height: null, problems: [] };
  }
  const backMm = plane?.standOffMm ?? 0;
  const checked = underCounterHeight({
    unitId: unit.id,
    drops,
    footprint: {
      x0Mm: placed.leftMm,
      x1Mm: placed.rightMm,
      y0Mm: backMm,
      y1Mm: backMm + run.carcassDepthMm,
    },
    undersideMm: run.z1Mm,
    datumDrop: datum.drop,
    datumSetUpId: datum.setUpId,
    floorToCome: floorToCome(context),
    needMm,
    uLevel: LASER_PLANE_U,
  }).value;
  if (!checked) return { height: null, problems: [] };
  const { verdict, margin, height } = checked;
  const words =
    verdict === 'too-low'
      ? `${unit.name || 'The appliance'} needs ${context.words(needMm)} under the counter: ${context.words(-margin.value)} too little.`
      : `${unit.name || 'The appliance'} has ${context.words(margin.value)} to spare under the counter, less than the readings are sure of.`;
  return {
    height: fitFigure('appliance-height', height),
    problems: verdict === 'enough' ? [] : [warning('appliance-too-low', words, [unit.id])],
  };
}

/** From the counter below to what hangs over it; the counter of a base run of the same wall. */
export function overCounter(
  context: FitContext,
  { run }: WorkedRun,
): { gap: FitFigure | null; problems: Problem[] } {
  const below = context.runs.find(({ wallId, level }) => wallId === run.wallId && level === 'base');
  if (run.level !== 'wall' || !below) return { gap: null, problems: [] };
  const { rules } = context;
  const topMm = below.z1Mm + rules.counterTopMm - rules.baseTopMm;
  const counter = [{ id: below.id, topMm: figure(topMm, 0, []) }];
  const checked = upperGap(counter, run.z0Mm, rules.counterToWallUnitMm).value;
  if (!checked) return { gap: null, problems: [] };
  const words = `Run ${run.name} hangs ${context.words(checked.height.value)} over the counter; the shop’s rule is ${context.words(rules.counterToWallUnitMm)}.`;
  return {
    gap: fitFigure('upper-gap', checked.height),
    problems: checked.margin.value < 0 ? [warning('upper-too-low', words, [run.id])] : [],
  };
}

/** Window sills and old counters against the counter of a base run. */
export function counterProblems(
  context: FitContext,
  { run }: WorkedRun,
  datum: FitDatum | null,
): Problem[] {
  if (run.level !== 'base') return [];
  const { rules } = context;
  const topMm = run.z1Mm + rules.counterTopMm - rules.baseTopMm;
  const newTop = figure(topMm, 0, []);
  const sills = context.book
    .ofKind('feature')
    .filter(({ wallId, feature }) => wallId === run.wallId && feature === 'window')
    .flatMap((window): Problem[] => {
      const zMm = Math.min(window.z0Mm, window.z1Mm);
      const u = lengthUncertainty(context.book.toolOf(window), zMm, 1);
      const sill: Figure = figure(zMm, u, [window.id]);
      const checked = sillOverCounter([{ id: run.id, topMm: newTop }], 0, sill).value;
      if (!checked || checked.verdict === 'enough') return [];
      const words = `A window sill lies ${context.words(checked.height.value)} over the counter of ${run.name}.`;
      return [warning('sill-at-counter', words, [window.id])];
    });
  return [...sills, ...stepProblems(context, run, newTop, datum)];
}

function stepProblems(
  context: FitContext,
  run: WorkedRun['run'],
  newTop: Figure,
  datum: FitDatum | null,
): Problem[] {
  if (!datum) return [];
  return [run.left, run.right].flatMap((end): Problem[] => {
    if (end.kind !== 'existing' || !end.counterDropsMm) return [];
    const old = end.counterDropsMm.map((dropMm, i) => ({
      id: i === 0 ? 'beside' : 'far',
      topMm: figure(datum.drop.value - dropMm, Math.hypot(datum.drop.u, 0.5), datum.drop.from),
    }));
    const steps = counterSteps(newTop, old, COUNTER_STEP_MM).value ?? [];
    return steps
      .filter(({ verdict }) => verdict !== 'flush')
      .map(({ id, step }) => {
        const where = id === 'beside' ? 'where they meet' : 'at its far end';
        const words = `The new counter of ${run.name} stands ${context.words(step.value)} over the old one ${where}.`;
        return warning('counter-steps', words, [run.id]);
      });
  });
}
