import { describe, expect, test } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { sampleRun, sampleUnit } from './sample-runs';
import { bookOf, countedId, squareRoom, type TrueRoom } from './true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const square = (over: Partial<TrueRoom> = {}): TrueRoom => ({ ...squareRoom, ...over });
const book = bookOf(square(), {
  diagonals: [
    [0, 2],
    [1, 3],
  ],
});
const id = (n: number) => countedId(1_000 + n);

function fitted(runs: Run[], n = 1, of: WallBook = book) {
  const fit = fitRoom(of, runs, rules);
  const run = fit.runs.find(({ runId }) => runId === id(n));
  if (!run) throw new Error('no such run');
  return { fit, run };
}

const common = { ...(book.readings[0] as Reading), id: countedId(60_000) };
const units = (...widths: number[]) => widths.map((widthMm, i) => sampleUnit(i + 1, { widthMm }));

describe('what a run meets at the corner', () => {
  // Wall A runs 3000 from left to right and ends at the corner with wall B.
  const onA = (over: Partial<Run> = {}) =>
    sampleRun(1, 0, { left: { kind: 'open', limitMm: 500 }, units: units(900, 600), ...over });
  const onB = (over: Partial<Run> = {}) =>
    sampleRun(2, 1, { right: { kind: 'open', limitMm: 2_000 }, units: units(600), ...over });

  test('a run that goes through stands in the way by its front', () => {
    const { run } = fitted([
      onA({ right: { kind: 'run', runId: id(2), through: 'other' } }),
      onB({ left: { kind: 'run', runId: id(1), through: 'this' } }),
    ]);
    // 3000 − 500 − 581 for the other's carcass, bumper and door.
    expect(run.clearOpening?.opening.value).toBeCloseTo(1_919, 0);
    expect(run.right).toMatchObject({
      meets: 'run',
      leastMm: 50,
      words: 'run Run 2, which goes through',
    });
    expect(run.right.filler?.least.value).toBeCloseTo(50, 1);
  });

  test('the run that goes through fills to the wall', () => {
    const { run } = fitted(
      [
        onA({ right: { kind: 'run', runId: id(2), through: 'other' } }),
        onB({ left: { kind: 'run', runId: id(1), through: 'this' } }),
      ],
      2,
    );
    expect(run.left.meets).toBe('wall');
    expect(run.clearOpening?.opening.value).toBeCloseTo(2_000, 0);
  });

  test('drawers beside the corner ask for a wider filler, a dishwasher for the widest', () => {
    const least = (kind: 'drawers' | 'dishwasher') =>
      fitted([
        onA({ right: { kind: 'run', runId: id(2), through: 'other' } }),
        onB({
          left: { kind: 'run', runId: id(1), through: 'this' },
          units: [sampleUnit(9, { kind })],
        }),
      ]).run.right.leastMm;
    expect(least('drawers')).toBe(rules.cornerFillerDrawersMm);
    expect(least('dishwasher')).toBeCloseTo(114.3, 6);
  });

  test('a corner unit joins two runs square, without a filler', () => {
    const out = bookOf(
      square({
        walls: square().walls.map((wall) =>
          wall.name === 'B' ? { ...wall, cornerDeg: 91 } : wall,
        ),
      }),
      {
        diagonals: [
          [0, 2],
          [1, 3],
        ],
      },
    );
    const runs = [
      onA({ right: { kind: 'run', runId: id(2), through: 'corner-unit' } }),
      onB({
        left: { kind: 'run', runId: id(1), through: 'corner-unit' },
        units: [sampleUnit(8, { kind: 'corner', widthMm: 900, armMm: 900 }), sampleUnit(9)],
      }),
    ];
    const { fit, run } = fitted(runs, 1, out);
    const other = fit.runs[1];
    const turns = (run.setLine?.turnDeg ?? 0) - (other?.setLine?.turnDeg ?? 0);
    // 91° between the walls, 90° between the set lines.
    expect(turns).toBeCloseTo(-1, 1);
    expect(run.right.filler).toBeNull();
    expect(other?.left.filler).toBeNull();
    // The arm takes 900 of this wall from the other's set line.
    const free = run.left.freeRoom?.value ?? 0;
    const offset = other?.setLine?.offsetAtLeftMm ?? 0;
    expect(free + 1_500 + 900 + offset).toBeCloseTo(2_500, -1);
  });

  test('runs that name no neighbour of theirs say so', () => {
    const { fit, run } = fitted([onA({ right: { kind: 'run', runId: id(77), through: 'other' } })]);
    expect(run.fill).toBeNull();
    expect(fit.problems.map(({ code }) => code)).toContain('other-run-missing');
  });
});

describe('casings and what an earlier phase has set', () => {
  test('a casing is filled to like a wall', () => {
    const { run } = fitted([sampleRun(1, 1, { right: { kind: 'casing', xMm: 1_600 } })]);
    expect(run.fill?.slack.value).toBeCloseTo(1_600 - 1_500 - 50 - 0.3, 0);
    expect(run.right.filler).not.toBeNull();
  });

  test('boxes butt against a cabinet already set, and the wall gets the filler', () => {
    const { run } = fitted([sampleRun(1, 1, { right: { kind: 'existing', xMm: 1_560 } })]);
    expect(run.right.filler).toBeNull();
    expect(run.left.filler?.least.value).toBeCloseTo(60 - 0.3, 0);
    expect(run.fill?.verdict).toBe('fits');
  });

  test('its back and turn become the set line, and a proud wall is to be cut', () => {
    const bowed = bookOf(
      square({
        walls: square().walls.map((wall) => (wall.name === 'B' ? { ...wall, bowMm: 8 } : wall)),
      }),
      { diagonals: [[0, 2]] },
    );
    const run = sampleRun(1, 1, {
      right: { kind: 'existing', xMm: 1_560, standOffMm: 2, turnDeg: 0 },
    });
    const fit = fitted([run], 1, bowed).run;
    expect(fit.setLine).toMatchObject({ turnDeg: 0 });
    expect(fit.setLine?.offsetAtRightMm).toBeCloseTo(2, 6);
    expect(fit.setLine?.wallToCut.length).toBeGreaterThan(0);
  });

  test('its kick line is the datum', () => {
    const run = sampleRun(1, 1, {
      right: { kind: 'existing', xMm: 1_560, undersideDropMm: 1_190 },
    });
    // The line is 1300 over a level floor, the old boxes' underside 1190 below it: 110 over the floor.
    const { kicks } = fitted([run]).run;
    expect(kicks?.least.value).toBeCloseTo(110, 6);
    expect(kicks?.highPoint).toBeNull();
  });

  test('an old counter that is not level shows a step', () => {
    const run = sampleRun(1, 1, {
      right: { kind: 'existing', xMm: 1_560, counterDropsMm: [390, 396] },
    });
    const problems = fitted([run]).fit.problems.filter(({ code }) => code === 'counter-steps');
    expect(problems.map(({ message }) => message)).toEqual([
      'The new counter of Run 1 stands 6 mm over the old one at its far end.',
    ]);
  });
});

describe('faces and floors still to come', () => {
  test('board over bare studs comes off every length, and the fit says so', () => {
    const bare: WallBook = {
      ...book,
      room: { ...book.room, wallThicknessToComeMm: 12.5 },
      readings: book.readings.map((reading) => ({ ...reading, touches: 'bare-stud' })),
    };
    const { fit, run } = fitted([sampleRun(1, 1)], 1, bare);
    expect(run.clearOpening?.opening.value).toBeCloseTo(2_375, 0);
    expect(fit.problems.map(({ code }) => code)).toContain('face-to-come');
    expect(run.clearOpening?.opening.u ?? 0).toBeGreaterThan(
      fitted([sampleRun(1, 1)]).run.clearOpening?.opening.u ?? 0,
    );
  });

  test('cabinets on a rough floor grow by the floor to come', () => {
    const rough = (cabinetsStandOn: 'finished-floor' | 'rough-floor'): WallBook => ({
      ...book,
      room: { ...book.room, floorToComeMm: 12, cabinetsStandOn },
    });
    const least = (on: 'finished-floor' | 'rough-floor') =>
      fitted([sampleRun(1, 1)], 1, rough(on)).run.kicks?.least.value;
    expect(least('finished-floor')).toBeCloseTo(100, 6);
    expect(least('rough-floor')).toBeCloseTo(112, 6);
  });
});

describe('fill', () => {
  test('a unit centred on a mark stands there', () => {
    const run = sampleRun(1, 1, {
      units: units(600, 800, 800),
      share: { how: 'centred', unitId: countedId(2_002), markMm: 1_060 },
    });
    const { run: fit } = fitted([run]);
    const centred = fit.units[1];
    expect(((centred?.leftMm ?? 0) + (centred?.rightMm ?? 0)) / 2).toBeCloseTo(1_060, 3);
  });

  test('a run that is short says what would make it fit', () => {
    const alterable = { minMm: 400, maxMm: 900, stepMm: 50 };
    const run = sampleRun(1, 1, {
      units: [
        sampleUnit(1, { widthMm: 900 }),
        sampleUnit(2, { widthMm: 900 }),
        sampleUnit(3, { name: 'Larder', widthMm: 650, alterable }),
      ],
    });
    const { fill } = fitted([run]).run;
    expect(fill?.verdict).toBe('short');
    expect(fill?.words).toMatch(/^Short: 10\d mm to lose\.$/);
    expect(fill?.suggestion?.words).toMatch(
      /^Larder 650 mm to 500 mm: fillers \d+ mm and \d+ mm\.$/,
    );
    const after = {
      ...run,
      units: run.units.map((unit) => (unit.name === 'Larder' ? { ...unit, widthMm: 500 } : unit)),
    };
    expect(fitted([after]).run.fill?.verdict).toBe('fits');
  });
});

describe('what hangs and what is on the wall', () => {
  const hung = sampleRun(1, 1, {
    level: 'wall',
    z0Mm: 1_400,
    z1Mm: 2_100,
    carcassDepthMm: 300,
    units: units(600, 900, 800),
  });
  const stud = (n: number, xMm: number): Reading => ({
    ...common,
    id: countedId(61_000 + n),
    kind: 'stud',
    wallId: countedId(101),
    xMm,
    at: 'centre',
  });

  test('each hung unit lists its studs, found and predicted', () => {
    const studs = [400, 800, 1_200].map((xMm, i) => stud(i, xMm));
    const { run } = fitted([hung], 1, { ...book, readings: [...book.readings, ...studs] });
    expect(run.units[0]?.studs).toMatchObject({ enough: false, needed: 2 });
    expect(run.units[1]?.studs?.studs.map(({ xMm }) => Math.round(xMm))).toEqual([800, 1_200]);
    expect(run.units[2]?.studs?.studs.some(({ predicted }) => predicted)).toBe(true);
  });

  test('an outlet in a gable is reported with the overlap', () => {
    const outlet: Reading = {
      ...common,
      id: countedId(62_000),
      kind: 'feature',
      wallId: countedId(101),
      feature: 'outlet',
      x0Mm: 620,
      x1Mm: 690,
      z0Mm: 300,
      z1Mm: 400,
      projectionMm: 0,
      swing: 'none',
      note: '',
    };
    const base = sampleRun(1, 1, { units: units(600, 900, 800) });
    const { fit } = fitted([base], 1, { ...book, readings: [...book.readings, outlet] });
    expect(fit.collisions.map(({ what }) => what)).toContain('in-gable');
    expect(fit.collisions[0]).toMatchObject({ runId: id(1), readingId: outlet.id });
  });

  test('a tall unit that cannot be stood up says so, and what would help', () => {
    const tall = sampleRun(1, 1, {
      level: 'tall',
      z0Mm: 20,
      z1Mm: 2_400,
      units: [sampleUnit(1, { kind: 'tall' })],
    });
    const { run } = fitted([tall]);
    expect(run.units[0]?.tilt?.standsUp).toBe(false);
    expect(run.units[0]?.tilt?.words).toContain('Build it in two');
    expect(run.ceiling?.left.value).toBeCloseTo(40, 6);
  });

  test('the largest unit is tried through the doorway', () => {
    const doorway: Reading = {
      ...common,
      id: countedId(63_000),
      kind: 'doorway',
      name: 'Back door',
      clearWidthMm: 700,
      clearHeightMm: 1_980,
    };
    const wide = sampleRun(1, 1, { carcassDepthMm: 720, units: units(1_200) });
    const { fit } = fitted([wide], 1, { ...book, readings: [...book.readings, doorway] });
    expect(fit.wayIn[0]).toMatchObject({ passes: false, name: 'Back door' });
  });

  test('an appliance too high for its counter is said', () => {
    const run = sampleRun(1, 1, {
      units: [sampleUnit(1, { kind: 'dishwasher', name: 'Dishwasher', needHeightMm: 900 })],
    });
    const { fit } = fitted([run]);
    const found = fit.problems.find(({ code }) => code === 'appliance-too-low');
    expect(found?.message).toBe('Dishwasher needs 900 mm under the counter: 30 mm too little.');
  });

  test('two runs that face each other leave an aisle', () => {
    const { fit } = fitted([sampleRun(1, 1), sampleRun(2, 3)]);
    // 3000 between walls B and D, 581 out of each.
    expect(fit.runs[0]?.aisle?.figure.value).toBeCloseTo(3_000 - 2 * 581, 0);
    expect(fit.verdicts.some(({ check }) => check === 'aisle')).toBe(true);
  });
});

describe('islands', () => {
  const island = sampleRun(2, 0, {
    left: { kind: 'open', limitMm: 0 },
    right: { kind: 'open', limitMm: 0 },
    units: [sampleUnit(1, { kind: 'sink', widthMm: 900 }), sampleUnit(2, { widthMm: 600 })],
    island: { setLineRunId: id(1), offsetMm: 1_600, alongMm: 750 },
  });
  const behind = sampleRun(1, 0, { units: units(900, 900, 900) });

  test('stands parallel to the set line it names, with room to walk on every side', () => {
    const { run } = fitted([behind, island], 2);
    expect(run.island?.corners[0]?.xMm).toBeCloseTo(750, 0);
    expect(run.island?.corners[0]?.yMm).toBeCloseTo(1_600, 0);
    const front = run.island?.aisles.find(({ side }) => side === 'front');
    // 2400 to the wall opposite, less 1600 and the island's own 581.
    expect(front?.clear.value).toBeCloseTo(219, 0);
    const back = run.island?.aisles.find(({ side }) => side === 'back');
    expect(back?.toId).toBe(id(1));
    expect(back?.clear.value).toBeCloseTo(1_600 - 581, 0);
    expect(run.verdicts.find(({ check }) => check === 'aisle')?.verdict).toBe('over');
  });

  test('has kick faces all round, and its own high point', () => {
    const { run } = fitted([behind, island], 2);
    expect(run.kicks?.returns.map(({ side }) => side)).toEqual(['left', 'right', 'back']);
    expect(run.kicks?.corners).toHaveLength(8);
    expect(run.island?.saw.value).toBeCloseTo(45, 6);
  });

  test('a peninsula is closed where it is built on', () => {
    const joined = { ...island, island: { offsetMm: 1_600, alongMm: 0, joined: 'left' as const } };
    const { run } = fitted([joined], 2);
    expect(run.island?.exposedCorners).toBe(2);
    expect(run.kicks?.returns.map(({ side }) => side)).toEqual(['right', 'back']);
  });

  test('says how far its sink stands from the pipes', () => {
    const waste: Reading = {
      ...common,
      id: countedId(64_000),
      kind: 'feature',
      wallId: countedId(100),
      feature: 'waste',
      x0Mm: 1_250,
      x1Mm: 1_290,
      z0Mm: 0,
      z1Mm: 0,
      projectionMm: 1_900,
      swing: 'none',
      note: '',
    };
    const { run } = fitted([behind, island], 2, { ...book, readings: [...book.readings, waste] });
    expect(run.island?.services[0]?.along.value).toBeCloseTo(70, 6);
    expect(run.island?.services[0]?.across.value).toBeCloseTo(20, 6);
  });
});
