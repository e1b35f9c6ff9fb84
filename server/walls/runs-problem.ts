import type { Run, RunEnd } from '@/lib/contracts/runs';
import type { Room } from '@/lib/contracts/wall-book';
import type { RefusalDetail } from '@/server/base/problem-response';

/** What is wrong with a set of runs as a whole, field by field; null when they can be kept. */
export function runsProblem(room: Room, runs: readonly Run[]): RefusalDetail | null {
  const wallIds = new Set(room.chains.flatMap(({ walls }) => walls.map(({ id }) => id)));
  const runIds = new Set(runs.map(({ id }) => id));
  const unitIds = new Set<string>();
  const errors: Record<string, string> = {};
  if (runIds.size < runs.length) errors.runs = 'Two runs have the same id.';
  for (const [index, run] of runs.entries()) {
    const at = (field: string) => `runs.${index}.${field}`;
    if (!wallIds.has(run.wallId)) errors[at('wallId')] = 'Pick a wall of this room.';
    if (run.z1Mm <= run.z0Mm) errors[at('z1Mm')] = 'The top must stand above the foot.';
    for (const side of ['left', 'right'] as const) {
      if (meetsNothing(run, run[side], runIds)) {
        errors[at(`${side}.runId`)] = 'Pick another run of this room.';
      }
    }
    const { share } = run;
    if (share.how === 'centred' && !run.units.some(({ id }) => id === share.unitId)) {
      errors[at('share.unitId')] = 'Pick a unit of this run to centre.';
    }
    for (const [place, unit] of run.units.entries()) {
      if (unitIds.has(unit.id)) errors[at(`units.${place}.id`)] = 'Two units have the same id.';
      unitIds.add(unit.id);
      if (unit.alterable && unit.alterable.minMm > unit.alterable.maxMm) {
        errors[at(`units.${place}.alterable.maxMm`)] =
          'The widest must not be under the narrowest.';
      }
    }
  }
  if (Object.keys(errors).length === 0) return null;
  return {
    status: 422,
    code: 'runs-do-not-hold-together',
    message: 'Something in these runs does not hold together. Nothing was changed.',
    errors,
  };
}

function meetsNothing(run: Run, end: RunEnd, runIds: ReadonlySet<string>): boolean {
  return end.kind === 'run' && (end.runId === run.id || !runIds.has(end.runId));
}
