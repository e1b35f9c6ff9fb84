import type { Run, Unit } from '@/lib/contracts/runs';
import type { Fit } from '@/lib/measure/fit';

/**
 * Hung boxes behind which are fewer studs than the shop's rule asks for, with their runs: they want backing.
 * Example: a box "W30" of the run "Hung" that catches one stud of two: "Hung: W30".
 */
export function shortOfStuds(
  runs: readonly Run[],
  fit: Fit,
  nameOf: (unit: Unit) => string,
): string[] {
  const units = new Map(runs.flatMap((run) => run.units).map((unit) => [unit.id, unit]));
  return fit.runs.flatMap((run) =>
    run.units.flatMap(({ studs, unitId }) => {
      const unit = units.get(unitId);
      return unit && studs && !studs.enough ? [`${run.name}: ${nameOf(unit)}`] : [];
    }),
  );
}
