import { describe, expect, test } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { readingPlan } from '@/lib/measure/reading-plan';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { sampleRun, sampleUnit } from './sample-runs';
import { bookOf, countedId, squareRoom as square, type TrueRoom, tape } from './true-room';

const metric = fitRules.parse(defaultShopRules('UK').fit);
const inches = fitRules.parse(defaultShopRules('US').fit);
const empty = (book: WallBook): WallBook => ({ ...book, readings: [] });

function skipOf(slot: string): Reading {
  return {
    id: countedId(70_000),
    roomId: countedId(1),
    toolId: tape.id,
    takenAt: '2026-01-05T10:00:00Z',
    typed: '',
    unit: 'mm',
    touches: 'board',
    kind: 'skip',
    slot,
    reason: 'Piano in the way',
  };
}

describe('a room before runs are laid out', () => {
  const missing = whatIsMissing(empty(bookOf(square)), [], metric);
  const words = missing.map((one) => one.words);

  test('asks for lean, floor and ceiling as well, and for nothing that only a run would need', () => {
    expect(words).toContain('Wall A, gap to the level 1500 mm from the left, at the floor');
    expect(words).toContain('Wall A, gap to the level 1500 mm from the left, at the ceiling');
    expect(words).toContain('Floor in corner D–A');
    expect(words).toContain('Ceiling in corner D–A');
    expect(missing.some(({ ask }) => ask.kind === 'stud' || ask.kind === 'feature')).toBe(false);
  });

  test('stays short: sixteen readings more for four walls', () => {
    const more = missing.filter(({ ask }) => ['face', 'floor', 'ceiling'].includes(ask.kind));
    expect(more).toHaveLength(16);
    expect(new Set(missing.map(({ slot }) => slot)).size).toBe(missing.length);
  });

  test('gives way to what the runs ask for once one is laid out', () => {
    const run = sampleRun(1, 1, { name: 'Sink wall' });
    const asked = whatIsMissing(empty(bookOf(square)), [run], metric);
    expect(asked.some(({ slot }) => /:corner$|:plumb:/.test(slot))).toBe(false);
  });
});

describe('an empty book', () => {
  const runs = [sampleRun(1, 1, { name: 'Sink wall' })];
  const missing = whatIsMissing(empty(bookOf(square)), runs, metric);

  test('asks for the corners, lengths and floor that the run cannot do without', () => {
    const must = missing.filter(({ need }) => need === 'must').map(({ words }) => words);
    expect(must).toContain('Corner A–B, at the counter');
    expect(must).toContain('Corner B–C, at the counter');
    expect(must).toContain('Wall B, length at the counter');
    expect(must).toContain('Wall B, length at the floor');
    expect(must.filter((words) => words.startsWith('Floor along wall B'))).toHaveLength(4);
  });

  test('walks round the walls in order, then the floor, then across', () => {
    const kinds = missing.map(({ ask }) => ask.kind);
    expect(kinds.indexOf('floor')).toBeGreaterThan(kinds.lastIndexOf('face'));
    expect(kinds.indexOf('diagonal')).toBeGreaterThan(kinds.lastIndexOf('floor'));
    const lengths = missing.flatMap(({ ask }) => (ask.kind === 'length' ? [ask.wallId] : []));
    expect([...new Set(lengths)]).toEqual([100, 101, 102, 103].map(countedId));
  });

  test('every key is stable, different and short enough to be skipped by', () => {
    const slots = missing.map(({ slot }) => slot);
    expect(new Set(slots).size).toBe(slots.length);
    expect(Math.max(...slots.map((slot) => slot.length))).toBeLessThanOrEqual(120);
    expect(slots).toContain(`length:${countedId(101)}:910`);
  });

  test('says why, with the run it is for', () => {
    const length = missing.find(({ slot }) => slot === `length:${countedId(101)}:910`);
    expect(length?.why).toBe('Sets the room for Sink wall at the counter.');
    expect(length?.ask).toEqual({
      kind: 'length',
      wallId: countedId(101),
      zMm: 910,
      yMm: 0,
      nominalMm: 2_400,
    });
  });

  test('asks for both diagonals of a room of four walls, and once each', () => {
    const diagonals = missing.filter(({ ask }) => ask.kind === 'diagonal');
    expect(diagonals.map(({ words }) => words)).toEqual([
      'Diagonal, left of wall A to left of wall C, at the counter',
      'Diagonal, left of wall B to left of wall D, at the counter',
    ]);
  });

  test('speaks in inches to an inch shop', () => {
    const words = whatIsMissing(empty(bookOf(square)), runs, inches).map((one) => one.words);
    expect(words).toContain('Wall B, length at 57"');
  });
});

describe('a book as it fills', () => {
  const runs = [sampleRun(1, 1)];

  test('a reading that was taken is asked for no more, and the others keep their keys', () => {
    const book = bookOf(square, { faces: false, floors: false });
    const before = whatIsMissing(empty(book), runs, metric).map(({ slot }) => slot);
    const after = whatIsMissing(book, runs, metric).map(({ slot }) => slot);
    expect(after.some((slot) => slot.startsWith('length:'))).toBe(false);
    expect(after.some((slot) => slot.startsWith('corner:'))).toBe(false);
    expect(before).toEqual(expect.arrayContaining(after));
  });

  test('a full book leaves nothing that must be read', () => {
    const book = bookOf(square, {
      diagonals: [
        [0, 2],
        [1, 3],
      ],
    });
    const must = whatIsMissing(book, runs, metric).filter(({ need }) => need === 'must');
    expect(must).toEqual([]);
  });

  test('a skipped reading stays, with its reason, until the skip is withdrawn', () => {
    const slot = `length:${countedId(101)}:910`;
    const book = empty(bookOf(square));
    const skip = skipOf(slot);
    const skipped = whatIsMissing({ ...book, readings: [skip] }, runs, metric);
    expect(skipped.find((one) => one.slot === slot)?.skipped).toEqual({
      readingId: skip.id,
      reason: 'Piano in the way',
    });
    const withdrawal: Reading = {
      ...skip,
      id: countedId(70_001),
      kind: 'withdrawal',
      readingId: skip.id,
      reason: 'It was moved',
    };
    const reopened = whatIsMissing({ ...book, readings: [skip, withdrawal] }, runs, metric);
    expect(reopened.find((one) => one.slot === slot)?.skipped).toBeNull();
  });

  test('a withdrawn reading is asked for again', () => {
    const book = bookOf(square);
    const corner = book.readings.find(
      (reading) => reading.kind === 'corner' && reading.cornerWallId === countedId(101),
    );
    const withdrawal: Reading = {
      ...skipOf(''),
      id: countedId(70_002),
      kind: 'withdrawal',
      readingId: corner?.id ?? '',
      reason: 'Tape slipped',
    };
    const missing = whatIsMissing(
      { ...book, readings: [...book.readings, withdrawal] },
      runs,
      metric,
    );
    expect(missing.map(({ slot }) => slot)).toContain(`corner:${countedId(101)}:910`);
  });

  test('one stud of two leaves one to find', () => {
    const hung = [sampleRun(2, 1, { level: 'wall', z0Mm: 1_400, z1Mm: 2_100 })];
    const stud: Reading = {
      ...skipOf(''),
      id: countedId(70_003),
      kind: 'stud',
      wallId: countedId(101),
      xMm: 400,
      at: 'centre',
    };
    const asked = (readings: Reading[]) =>
      whatIsMissing({ ...bookOf(square), readings }, hung, metric).filter(
        ({ ask }) => ask.kind === 'stud',
      ).length;
    expect([asked([]), asked([stud])]).toEqual([2, 1]);
  });

  test('the set-up already begun is gone on with', () => {
    const book = bookOf(square);
    const first = book.readings.find(({ kind }) => kind === 'floor');
    const begun = { ...book, readings: first ? [first] : [] };
    const asks = whatIsMissing(begun, runs, metric).flatMap(({ ask }) =>
      ask.kind === 'floor' ? [ask.setUpId] : [],
    );
    expect(new Set(asks)).toEqual(new Set([countedId(6_000)]));
  });
});

describe('other rooms', () => {
  test('a tall unit asks for the ceiling and the way in', () => {
    const runs = [
      sampleRun(1, 1, { level: 'tall', z1Mm: 2_100, units: [sampleUnit(1, { kind: 'tall' })] }),
    ];
    const kinds = whatIsMissing(empty(bookOf(square)), runs, metric).map(({ ask }) => ask.kind);
    expect(kinds).toContain('ceiling');
    expect(kinds).toContain('doorway');
  });

  test('an island asks for its own floor, and for no wall behind it', () => {
    const island = sampleRun(1, 1, {
      name: 'Island',
      left: { kind: 'open', limitMm: 0 },
      right: { kind: 'open', limitMm: 0 },
      island: { offsetMm: 1_200, alongMm: 600 },
    });
    const missing = whatIsMissing(empty(bookOf(square)), [island], metric);
    expect(missing.some(({ ask }) => ask.kind === 'face')).toBe(false);
    const floor = missing.filter(({ ask }) => ask.kind === 'floor');
    expect(floor.filter(({ need }) => need === 'must')).toHaveLength(4);
    expect(floor[0]?.words).toBe(
      'Floor under Island, back, 600 mm from the left of wall B, 1200 mm out',
    );
  });

  test('an outside corner is taken past the corner', () => {
    const breast: TrueRoom = {
      closed: false,
      zRefMm: 910,
      walls: [
        { name: 'A', lengthMm: 2_000, cornerDeg: null },
        { name: 'B', lengthMm: 400, cornerDeg: 270 },
        { name: 'C', lengthMm: 2_000, cornerDeg: 90 },
      ],
    };
    const corner = whatIsMissing(empty(bookOf(breast)), [], metric).find(
      ({ ask }) => ask.kind === 'corner' && ask.carriedPast,
    );
    expect(corner?.words).toBe('Corner A–B, at the counter');
    expect(corner?.ask).toMatchObject({ nominalDeg: 270, legMm: 300 });
  });

  test('the two sides of a galley are tied by widths', () => {
    const book = empty(bookOf(square));
    const chains = ['A', 'B'].map((name, i) => ({
      closed: false,
      walls: [{ id: countedId(100 + i), name, nominalLengthMm: 3_000, leftCornerDeg: null }],
    }));
    const galley = { ...book, room: { ...book.room, chains } };
    const widths = whatIsMissing(galley, [sampleRun(1, 0)], metric).filter(
      ({ ask }) => ask.kind === 'width',
    );
    expect(widths.map(({ need }) => need)).toEqual(['must', 'must']);
  });

  test('runs on walls that the room has not got ask for nothing', () => {
    const book = empty(bookOf(square));
    expect(whatIsMissing(book, [sampleRun(1, 77)], metric)).toEqual(
      whatIsMissing(book, [], metric),
    );
  });

  test('the plan counts what was taken too', () => {
    const book = bookOf(square);
    const plan = readingPlan(book, [sampleRun(1, 1)], metric);
    const open = plan.filter(({ takenBy }) => takenBy.length === 0);
    expect(plan.length).toBeGreaterThan(open.length);
    expect(open).toEqual(whatIsMissing(book, [sampleRun(1, 1)], metric));
  });
});
