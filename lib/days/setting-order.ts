import type { Run, Unit } from '@/lib/contracts/runs';
import { unitWords } from '@/lib/sheet/unit-words';

export type SettingStep =
  | { step: 'lines' }
  | {
      step: 'tall' | 'wall' | 'base' | 'island';
      runName: string;
      startAt: string;
      why: StartReason;
    }
  | { step: 'fillers' | 'kicks' | 'doors' | 'walk' };

/** corner: it fixes both walls; centred: its mark fixes it; appliance: its opening must not shrink. */
export type StartReason = 'corner' | 'centred' | 'appliance' | 'end';

/**
 * The order in which the runs are set, and in each the box that goes first.
 *
 * Lines off the high point, tall units secured, wall units, bases from the corner outwards, islands; then
 * fillers, kicks, doors and the walk. Setting bases before wall units is the crew's choice where boxes must
 * be altered for level. Boxes are named in English unless said otherwise. Edge: a run without boxes is left out.
 * Example: a base run with a corner unit starts at the corner; one with a sink centred on a window at the sink.
 * Source: one maker's field manual 2017 (S04), custom shops (S05), UK practice (S16), gap-filling order (S19).
 */
export function settingOrder(
  runs: readonly Run[],
  nameOf: (unit: Unit) => string = unitWords,
): SettingStep[] {
  const filled = runs.filter(({ units }) => units.length > 0);
  const of = (step: 'tall' | 'wall' | 'base' | 'island', among: readonly Run[]): SettingStep[] =>
    among.map((run) => {
      const { unit, why } = startOf(run);
      return { step, runName: run.name, startAt: unit ? nameOf(unit) : '', why };
    });
  const standing = filled.filter(({ level, island }) => level === 'base' && !island);
  return [
    { step: 'lines' },
    ...of(
      'tall',
      filled.filter(({ level }) => level === 'tall'),
    ),
    ...of(
      'wall',
      filled.filter(({ level }) => level === 'wall'),
    ),
    // The run with the corner fixes those that meet it.
    ...of(
      'base',
      [...standing].sort((one, other) => rank(one) - rank(other)),
    ),
    ...of(
      'island',
      filled.filter(({ level, island }) => level === 'base' && island),
    ),
    { step: 'fillers' },
    { step: 'kicks' },
    { step: 'doors' },
    { step: 'walk' },
  ];
}

function startOf(run: Run): { unit: Unit | undefined; why: StartReason } {
  const { share } = run;
  const centred =
    share.how === 'centred' ? run.units.find(({ id }) => id === share.unitId) : undefined;
  if (centred) return { unit: centred, why: 'centred' };
  const corner = run.units.find(({ kind }) => kind === 'corner');
  if (corner) return { unit: corner, why: 'corner' };
  const tightest = run.units.find(({ kind }) => kind === 'refrigerator' || kind === 'range');
  if (tightest) return { unit: tightest, why: 'appliance' };
  // Where one end is fixed and the other free, the fixed one first.
  const last = run.left.kind === 'open' && run.right.kind !== 'open';
  return { unit: last ? run.units.at(-1) : run.units[0], why: 'end' };
}

const ranks: Record<StartReason, number> = { centred: 0, corner: 1, appliance: 2, end: 3 };
const rank = (run: Run): number => ranks[startOf(run).why];
