import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { sampleRun, sampleUnit } from './sample-runs';
import {
  type BookOptions,
  bookOf,
  cornersAt,
  countedId,
  type TrueRoom,
  tape,
  trueAngle,
  trueLength,
} from './true-room';
import { mirroredBook, mirroredRun, walkedFromNext } from './turned-book';

const rules = fitRules.parse(defaultShopRules('UK').fit);

/** Out of true everywhere: five walls, one of them short, one corner of 270. */
const kitchen: TrueRoom = {
  closed: true,
  zRefMm: 910,
  floor: (xMm, yMm) => -0.004 * xMm + 0.002 * yMm,
  walls: [
    { name: 'A', lengthMm: 3_003, cornerDeg: 89.4, lean: 0.004, bowMm: 4 },
    { name: 'B', lengthMm: 2_412, cornerDeg: 90.7, lean: -0.003, bowMm: -3 },
    { name: 'C', lengthMm: 1_204, cornerDeg: 89.2, lean: 0.002, bowMm: 1 },
    { name: 'D', lengthMm: 805, cornerDeg: 270.4, lean: 0.001, bowMm: 0 },
    { name: 'E', lengthMm: 1_797, cornerDeg: 89.8, lean: -0.002, bowMm: 2 },
    { name: 'F', lengthMm: 1_610, cornerDeg: 90.2, lean: 0.003, bowMm: -2 },
  ],
};
const runs: Run[] = [
  sampleRun(1, 1, {
    right: { kind: 'run', runId: countedId(1_002), through: 'this' },
    units: [sampleUnit(1), sampleUnit(2, { widthMm: 900 }), sampleUnit(3, { widthMm: 800 })],
  }),
  sampleRun(2, 0, {
    left: { kind: 'open', limitMm: 400 },
    right: { kind: 'wall' },
    units: [sampleUnit(4, { widthMm: 800 }), sampleUnit(5, { widthMm: 1_000 })],
  }),
  sampleRun(3, 1, {
    level: 'wall',
    z0Mm: 1_400,
    z1Mm: 2_100,
    carcassDepthMm: 300,
    share: { how: 'left' },
  }),
];
const full: BookOptions = {
  diagonals: [
    [0, 2],
    [1, 5],
    [0, 4],
  ],
};

function fitOf(book: WallBook, over: { runs?: Run[] } = {}): Fit {
  return fitRoom(book, over.runs ?? runs, rules);
}

const runFit = (fit: Fit, n: number) => {
  const found = fit.runs.find(({ runId }) => runId === countedId(1_000 + n));
  if (!found) throw new Error(`no run ${n}`);
  return found;
};

/** Every figure of a fit, by the path that leads to it. */
function figuresOf(value: unknown, path = '', found = new Map<string, FitFigure>()) {
  if (value === null || typeof value !== 'object') return found;
  if ('kind' in value && 'U' in value && 'from' in value) {
    found.set(path, value as FitFigure);
    return found;
  }
  for (const [key, inner] of Object.entries(value)) figuresOf(inner, `${path}/${key}`, found);
  return found;
}

/** Paths of numbers that are not finite. */
function notNumbers(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => notNumbers(inner, `${path}/${key}`));
}

describe('readings without error', () => {
  const fit = fitOf(bookOf(kitchen, full));

  test('give back the lengths and angles of the room', () => {
    kitchen.walls.forEach((_, i) => {
      const { length } = fit.walls[i] ?? {};
      expect(Math.abs((length?.value ?? 0) - trueLength(kitchen, i, 910))).toBeLessThan(0.3);
      const corner = fit.corners[i];
      expect(Math.abs((corner?.angle?.value ?? 0) - trueAngle(kitchen, i))).toBeLessThan(0.03);
    });
  });

  test('hold together: nobody is suspected', () => {
    expect(fit.closure.suspect).toBeNull();
    expect(fit.closure.adjustment?.chiSquare.passes).toBe(true);
  });

  test('give the opening that the true faces leave', () => {
    for (const n of [1, 3]) {
      const { setLine, clearOpening } = runFit(fit, n);
      if (!setLine || !clearOpening) throw new Error('not fitted');
      const run = runs.find(({ id }) => id === countedId(1_000 + n));
      const truth = trueOpening(kitchen, 1, setLine, run as Run);
      expect(clearOpening.opening.value).toBeLessThan(truth + 0.5);
      expect(truth - clearOpening.opening.value).toBeLessThan(1.5);
    }
  });

  test('find the high point of the floor and the kick over it', () => {
    const { kicks } = runFit(fit, 1);
    expect(kicks?.least.value).toBeCloseTo(100, 3);
    expect(kicks?.greatest.value ?? 0).toBeGreaterThan(101);
    expect(fit.floor?.fall.value ?? 0).toBeGreaterThan(8);
  });
});

/** By the true walls: how wide a plumb block goes between them along the set line. */
function trueOpening(
  room: TrueRoom,
  index: number,
  line: { offsetAtLeftMm: number; xLeftMm: number; turnDeg: number },
  run: Run,
): number {
  const corners = cornersAt(room, 910);
  const at = (i: number) => corners[(i + corners.length) % corners.length] ?? { x: 0, y: 0 };
  const unit = (i: number) => {
    const [a, b] = [at(i), at(i + 1)];
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    return { x: (b.x - a.x) / length, y: (b.y - a.y) / length, length };
  };
  const own = unit(index);
  const turn = (line.turnDeg * Math.PI) / 180;
  const along = {
    x: own.x * Math.cos(turn) - own.y * Math.sin(turn),
    y: own.x * Math.sin(turn) + own.y * Math.cos(turn),
  };
  const out = { x: -along.y, y: along.x };
  const standOff = line.offsetAtLeftMm - Math.tan(turn) * line.xLeftMm;
  const start = { x: at(index).x - own.y * standOff, y: at(index).y + own.x * standOff };
  const depth = run.carcassDepthMm + run.bumperMm + run.doorMm;
  let [left, right] = [-Infinity, Infinity];
  for (let i = 0; i <= 40; i++) {
    for (let j = 0; j <= 40; j++) {
      const y = (depth * i) / 40;
      const z = run.z0Mm + ((run.z1Mm - run.z0Mm) * j) / 40;
      const p = { x: start.x + out.x * y, y: start.y + out.y * y };
      for (const side of [-1, 1] as const) {
        const wallIndex = (index + side + room.walls.length) % room.walls.length;
        const wall = room.walls[wallIndex];
        const direction = unit(wallIndex);
        const corner = side === -1 ? at(index) : at(index + 1);
        const away = { x: side * direction.x, y: side * direction.y };
        const inward = { x: -direction.y, y: direction.x };
        const distance = (p.x - corner.x) * away.x + (p.y - corner.y) * away.y;
        const part = Math.min(1, Math.max(0, distance / direction.length));
        const proud = (wall?.lean ?? 0) * (z - 910) + (wall?.bowMm ?? 0) * 4 * part * (1 - part);
        const gap = (corner.x - p.x) * inward.x + (corner.y - p.y) * inward.y + proud;
        const x = gap / (along.x * inward.x + along.y * inward.y);
        if (side === -1) left = Math.max(left, x);
        else right = Math.min(right, x);
      }
    }
  }
  return right - left;
}

describe('the same room seen otherwise', () => {
  const book = bookOf(kitchen, { ...full, noiseMm: 0.4, seed: 3 });
  const fit = fitOf(book);

  test('a mirrored room mirrors the fit', () => {
    // A straightedge carried past an outside corner lies on one wall, and has no mirror image.
    const plain = withFinder(book);
    const fit = fitOf(plain);
    const mirrored = fitOf(mirroredBook(plain), {
      runs: runs.map((run) => {
        const wall = fit.walls.find(({ wallId }) => wallId === run.wallId);
        return mirroredRun(run, wall?.length?.value ?? 0);
      }),
    });
    for (const wall of fit.walls) {
      const other = mirrored.walls.find(({ wallId }) => wallId === wall.wallId);
      expect(other?.length?.value).toBeCloseTo(wall.length?.value ?? 0, 3);
      expect(other?.length?.u).toBeCloseTo(wall.length?.u ?? 0, 3);
    }
    for (const run of fit.runs) {
      const other = mirrored.runs.find(({ runId }) => runId === run.runId);
      expect(other?.fill?.verdict).toBe(run.fill?.verdict);
      expect(other?.fill?.slack.value).toBeCloseTo(run.fill?.slack.value ?? 0, 2);
      // A limit counts from the wall's left corner: mirrored, the length takes part or no longer does.
      if (!run.left.freeRoom) {
        expect(other?.fill?.slack.u).toBeCloseTo(run.fill?.slack.u ?? 0, 2);
      }
      expect(other?.clearOpening?.opening.value).toBeCloseTo(
        run.clearOpening?.opening.value ?? 0,
        2,
      );
      expect(other?.setLine?.turnDeg).toBeCloseTo(-(run.setLine?.turnDeg ?? 0), 3);
      expect(other?.left.filler?.least.value).toSatisfy(near(run.right.filler?.least.value));
      expect(other?.right.filler?.blank.value).toBe(run.left.filler?.blank.value);
      expect(other?.kicks?.greatest.value).toSatisfy(near(run.kicks?.greatest.value));
    }
  });

  test('walked from the next wall it is the same', () => {
    const walked = fitOf(walkedFromNext(book));
    for (const run of fit.runs) {
      const other = walked.runs.find(({ runId }) => runId === run.runId);
      expect(other?.fill?.slack.value).toBeCloseTo(run.fill?.slack.value ?? 0, 3);
      expect(other?.fill?.slack.u).toBeCloseTo(run.fill?.slack.u ?? 0, 3);
      expect(other?.left.filler?.blank.value).toBe(run.left.filler?.blank.value);
    }
    expect(walked.closure.adjustment?.chiSquare.value).toBeCloseTo(
      fit.closure.adjustment?.chiSquare.value ?? 0,
      3,
    );
  });

  test('readings in another order give the same figures', () => {
    const shuffled = { ...book, readings: [...book.readings].reverse() };
    const other = figuresOf(fitOf(shuffled).runs);
    for (const [path, { value, u }] of figuresOf(fit.runs)) {
      if (path.includes('backGaps')) continue;
      expect(other.get(path)?.value).toBeCloseTo(value, 3);
      expect(other.get(path)?.u).toBeCloseTo(u, 3);
    }
  });

  test('twice is the same to the byte, and the book is not touched', () => {
    const before = JSON.stringify([book, runs, rules]);
    expect(JSON.stringify(fitOf(book))).toBe(JSON.stringify(fit));
    expect(JSON.stringify([book, runs, rules])).toBe(before);
  });
});

/** Outside corners read with an angle finder. */
function withFinder(book: WallBook): WallBook {
  const finder = {
    id: countedId(900_003),
    name: 'Angle finder',
    spec: { kind: 'angle-finder' as const, mpeDeg: 0.1, stepDeg: 0.05, repeatabilityDeg: 0.05 },
  };
  const readings = book.readings.map((reading): Reading => {
    if (reading.kind !== 'corner' || reading.by.method !== 'legs' || !reading.by.carriedPast) {
      return reading;
    }
    const angleDeg = trueAngle(kitchen, 3);
    return { ...reading, toolId: finder.id, by: { method: 'angle', angleDeg } };
  });
  return { ...book, readings, tools: [...book.tools, finder] };
}

function near(wanted: number | undefined) {
  return (found: number | undefined) =>
    wanted === undefined ? found === undefined : Math.abs((found ?? Infinity) - wanted) < 0.01;
}

describe('one more reading that agrees', () => {
  const base = bookOf(kitchen, { diagonals: [[0, 2]], heightsMm: [100, 910, 1_450] });
  const before = figuresOf(fitOf(base));
  const common = base.readings[0] as Reading;
  const corners = cornersAt(kitchen, 910);
  const more: Record<string, Partial<Reading> & { kind: Reading['kind'] }> = {
    'a repeat of a length': {
      kind: 'length',
      wallId: countedId(101),
      zMm: 910,
      yMm: 0,
      valueMm: trueLength(kitchen, 1, 910),
    },
    'a length at another height': {
      kind: 'length',
      wallId: countedId(101),
      zMm: 500,
      yMm: 0,
      valueMm: trueLength(kitchen, 1, 500),
    },
    'a length of another wall': {
      kind: 'length',
      wallId: countedId(103),
      zMm: 500,
      yMm: 0,
      valueMm: trueLength(kitchen, 3, 500),
    },
    'a diagonal': {
      kind: 'diagonal',
      fromCornerWallId: countedId(101),
      toCornerWallId: countedId(105),
      zMm: 910,
      valueMm: Math.hypot(
        (corners[1]?.x ?? 0) - (corners[5]?.x ?? 0),
        (corners[1]?.y ?? 0) - (corners[5]?.y ?? 0),
      ),
    },
    'a corner again': base.readings.find(
      (reading) => reading.kind === 'corner' && reading.cornerWallId === countedId(101),
    ) as Reading,
  };

  test('more gaps in a column of a straight wall make no U of a cut size larger', () => {
    const first = base.readings.find(({ kind }) => kind === 'face');
    if (first?.kind !== 'face') throw new Error('no face reading');
    // On the same lean: 4 mm/m back for every metre down.
    const column = [200, 500, 700].map((downMm, i): Reading => {
      const gapMm = first.gapMm + 0.004 * (downMm - (910 - first.zMm));
      return { ...first, id: countedId(78_000 + i), zMm: 910 - downMm, gapMm };
    });
    const after = figuresOf(fitOf({ ...base, readings: [...base.readings, ...column] }));
    const grown = [...before].filter(([path, figure]) => {
      const now = after.get(path);
      const isCutSize = path.startsWith('/runs') && !path.includes('backGaps');
      return isCutSize && now?.kind === figure.kind && now.U > figure.U + 0.02;
    });
    expect(grown.map(([path, { U }]) => `${path} ${U} → ${after.get(path)?.U}`)).toEqual([]);
  });

  test.each(Object.entries(more))('%s makes no U larger', (_, reading) => {
    const added = { ...common, ...reading, id: countedId(77_777) } as Reading;
    const after = figuresOf(fitOf({ ...base, readings: [...base.readings, added] }));
    const grown = [...before].filter(([path, figure]) => {
      const now = after.get(path);
      return now && now.kind === figure.kind && now.U > figure.U + 0.002;
    });
    expect(grown.map(([path, { U }]) => `${path} ${U} → ${after.get(path)?.U}`)).toEqual([]);
  });
});

describe('books that are not full', () => {
  const book = bookOf(kitchen, { ...full, noiseMm: 0.4 });

  test('an empty book gives problems and no cut size', () => {
    const fit = fitOf({ ...book, readings: [] });
    expect(fit.runs.every(({ fill }) => fill === null)).toBe(true);
    expect(fit.problems.map(({ code }) => code)).toContain('corner-not-read');
    expect(notNumbers(fit)).toEqual([]);
  });

  test('no part of a book throws or gives a number that is none', () => {
    fc.assert(
      fc.property(fc.subarray(book.readings), (readings) => {
        expect(notNumbers(fitOf({ ...book, readings }))).toEqual([]);
      }),
      { seed: 6, numRuns: 25, endOnFailure: true },
    );
  }, 30_000);

  test('a run is fitted as soon as its own wall and corners are read', () => {
    const own = book.readings.filter(
      (reading) =>
        (reading.kind === 'length' && reading.wallId === countedId(101)) ||
        (reading.kind === 'corner' &&
          [countedId(101), countedId(102)].includes(reading.cornerWallId)),
    );
    const fit = fitOf({ ...book, readings: own });
    expect(runFit(fit, 1).fill).not.toBeNull();
    expect(runFit(fit, 2).fill).toBeNull();
    expect(runFit(fit, 1).setLine?.assumed).toBe(true);
  });

  test('a room with no walls read and runs on none of its walls is empty, not an error', () => {
    const fit = fitRoom({ ...book, readings: [] }, [sampleRun(9, 55)], rules);
    expect(fit.runs).toEqual([]);
    expect(fit.problems.map(({ code }) => code)).toContain('run-without-wall');
  });
});

describe('a slip of the hand', () => {
  test('a wall typed 100 mm too long at one height is named', () => {
    const book = bookOf(kitchen, { ...full, noiseMm: 0.3, seed: 9 });
    const readings = book.readings.map((reading) =>
      reading.kind === 'length' && reading.wallId === countedId(102) && reading.zMm === 910
        ? { ...reading, valueMm: reading.valueMm + 100 }
        : reading,
    );
    const { suspect } = fitOf({ ...book, readings }).closure;
    expect(suspect?.readings[0]?.words).toBe('Wall C, length at the counter');
    expect(suspect?.readings[0]?.slip).toBeGreaterThan(90);
    expect(suspect?.readings[0]?.known).toBe('100 mm');
    expect(suspect?.words).toContain('too long');
  });
});

describe('verdicts', () => {
  test('name the rule and its source, worst first', () => {
    const leaning = {
      ...kitchen,
      walls: kitchen.walls.map((wall) => (wall.name === 'B' ? { ...wall, lean: 0.009 } : wall)),
    };
    const { verdicts } = fitOf(bookOf(leaning, full));
    expect(verdicts[0]).toMatchObject({
      check: 'wall-plumb',
      verdict: 'over',
      source: 'common practice, no source',
    });
    const published = fitRoom(bookOf(leaning, full), runs, { ...rules, ruleSet: 'nhbc-2020' });
    const plumb = published.verdicts.find(({ check }) => check === 'wall-plumb');
    expect(plumb).toMatchObject({ clause: '9.1.3', edition: '2020', limitMm: 8 });
  });
});

describe('tools', () => {
  test('a finer tape makes every cut size surer', () => {
    const fine = {
      ...tape,
      spec: {
        ...tape.spec,
        kind: 'tape' as const,
        accuracyClass: 'I' as const,
        stepMm: 0.5,
        repeatabilityMm: 0.1,
      },
    };
    const book = bookOf(kitchen, full);
    const other = fitOf({ ...book, tools: [fine, ...book.tools.slice(1)] });
    const slack = runFit(fitOf(book), 1).fill?.slack.u ?? 0;
    expect(runFit(other, 1).fill?.slack.u ?? Infinity).toBeLessThan(slack);
  });
});
