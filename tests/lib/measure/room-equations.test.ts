import { describe, expect, it } from 'vitest';
import { equationOf } from '@/lib/measure/room-equations';
import { layOutRoom } from '@/lib/measure/room-layout';
import type { RoomObservation } from '@/lib/measure/room-observations';
import type { RoomState } from '@/lib/measure/room-state';
import { readDiagonal, readLegs, readLength, type Tape } from './random-readings';
import { CROOKED, drawnShape, randomPlan, wallId } from './random-room';
import { seeded } from './seeded';

const tape: Tape = {
  read: (trueMm) => ({ valueMm: trueMm, uMm: 0.6, tool: { toolId: 'tape', uCommon: 0.5 } }),
};
const random = seeded(21);
const plan = { ...randomPlan(random, 7, CROOKED), zRefMm: 910 };
const front = readLength(plan, tape, 2, 1_450);
const observations: RoomObservation[] = [
  ...plan.corners.flatMap((_, i) => [
    readLength(plan, tape, i, 1_450),
    readLegs(plan, random, tape, i, 910),
  ]),
  ...(front.kind === 'length' ? [{ ...front, yMm: 600 }] : []),
  readDiagonal(plan, tape, 0, 3, 100),
  {
    kind: 'width',
    wallId: wallId(0),
    xMm: 700,
    toWallId: wallId(3),
    zMm: 100,
    valueMm: 2_000,
    uMm: 0.6,
    readingIds: ['width'],
    unit: 'mm',
  },
  { kind: 'plumb', wallId: wallId(1), leanMmPerMm: 0.002, u: 0.001, readingIds: [], unit: 'mm' },
];

function stateAt(): RoomState {
  const layout = layOutRoom(drawnShape(plan), observations, 910);
  const nuisance = Float64Array.from({ length: layout.unknownCount }, (_, i) => {
    const isLean = layout.walls.some((w) => w.leanColumn === i || w.twistColumn === i);
    return (isLean ? 0.003 : 1) * random.between(-1, 1);
  });
  return {
    layout,
    zRefMm: 910,
    usualBowMm: 3,
    x: Float64Array.from(plan.corners, ({ x }) => x),
    y: Float64Array.from(plan.corners, ({ y }) => y),
    nuisance,
  };
}

/** Moves one unknown, whatever it is. */
function moved(state: RoomState, column: number, by: number): RoomState {
  const next = {
    ...state,
    x: state.x.slice(),
    y: state.y.slice(),
    nuisance: state.nuisance.slice(),
  };
  state.layout.points.forEach((point, i) => {
    if (point.xColumn === column) next.x[i] = (next.x[i] ?? 0) + by;
    if (point.yColumn === column) next.y[i] = (next.y[i] ?? 0) + by;
  });
  next.nuisance[column] = (next.nuisance[column] ?? 0) + by;
  return next;
}

describe('observation equations', () => {
  it.each(observations.map((o, i) => [`${o.kind} ${i}`, o] as const))(
    'moves %s with every unknown as small steps do',
    (_, observation) => {
      const state = stateAt();
      const equation = equationOf(state, observation);
      expect(equation).not.toBeNull();
      for (let column = 0; column < state.layout.unknownCount; column++) {
        const isLean = state.layout.walls.some(
          (wall) => wall.leanColumn === column || wall.twistColumn === column,
        );
        const step = isLean ? 1e-5 : 1e-2;
        const above = equationOf(moved(state, column, step), observation)?.predicted ?? Number.NaN;
        const below = equationOf(moved(state, column, -step), observation)?.predicted ?? Number.NaN;
        const slope = (above - below) / (2 * step);
        const place = equation?.columns.indexOf(column) ?? -1;
        const partial = place < 0 ? 0 : (equation?.partials[place] ?? 0);
        // Left out: what twist and bow at the front turn with a wall's length, some parts in ten thousand.
        const scale = Math.max(Math.abs(slope), observation.kind === 'corner' ? 1e-4 : 1);
        expect(Math.abs(partial - slope) / scale).toBeLessThan(0.002);
      }
    },
  );

  it('predicts what was read in the true room', () => {
    const layout = layOutRoom(drawnShape(plan), observations, 910);
    const state: RoomState = {
      ...stateAt(),
      layout,
      nuisance: new Float64Array(layout.unknownCount),
    };
    layout.walls.forEach((wall, i) => {
      state.nuisance[wall.leanColumn] = plan.leans[i] ?? 0;
      state.nuisance[wall.twistColumn] = plan.twists[i] ?? 0;
    });
    for (const observation of observations) {
      if (observation.kind !== 'length' || observation.yMm > 0) continue;
      expect(equationOf(state, observation)?.predicted).toBeCloseTo(observation.valueMm, 6);
    }
  });
});
