/** Runs for tests. */
import type { Run, Unit } from '@/lib/contracts/runs';
import { countedId } from './true-room';

export function sampleUnit(n: number, over: Partial<Unit> = {}): Unit {
  return {
    id: countedId(2_000 + n),
    name: `Unit ${n}`,
    kind: 'base',
    widthMm: 600,
    alterable: null,
    ...over,
  };
}

export function sampleRun(n: number, wall: number, over: Partial<Run> = {}): Run {
  return {
    id: countedId(1_000 + n),
    wallId: countedId(100 + wall),
    name: `Run ${n}`,
    level: 'base',
    left: { kind: 'wall' },
    right: { kind: 'wall' },
    carcassDepthMm: 560,
    bumperMm: 2,
    doorMm: 19,
    z0Mm: 100,
    z1Mm: 870,
    units: [sampleUnit(n * 10), sampleUnit(n * 10 + 1, { widthMm: 900 })],
    share: { how: 'equal' },
    counterGroup: null,
    ...over,
  };
}
