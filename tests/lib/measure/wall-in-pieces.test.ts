import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { piecesReading, type Reading, type ReadingOf } from '@/lib/contracts/readings';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import { fitRoom } from '@/lib/measure/fit-room';
import { IN_THE_WAY } from '@/lib/measure/in-the-way';
import { proveRoom } from '@/lib/measure/prove-room';
import { readingPlan } from '@/lib/measure/reading-plan';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { piecesUncertainty, wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { notNumbers } from './fuzzed-readings';
import { monteCarlo, seeded } from './seeded';
import { bookOf, countedId, squareRoom, tape } from './true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const book = bookOf(squareRoom, {
  diagonals: [
    [0, 2],
    [1, 3],
  ],
  noiseMm: 0.3,
});
const wallA = countedId(100);
const common = {
  roomId: countedId(1),
  toolId: tape.id,
  takenAt: '2026-01-05T10:00:00Z',
  typed: '',
  unit: 'mm' as const,
  touches: 'board' as const,
};
const inPieces = (piecesMm: number[], zMm = 910): ReadingOf<'pieces'> => ({
  ...common,
  id: countedId(80_000),
  kind: 'pieces',
  wallId: wallA,
  zMm,
  piecesMm,
});
const isWholeOfA = (reading: Reading, zMm = 910) =>
  reading.kind === 'length' && reading.wallId === wallA && reading.zMm === zMm;
const withPieces = (pieces: Reading, given: WallBook = book): WallBook => ({
  ...given,
  readings: [...given.readings, pieces],
});
const withoutWhole: WallBook = {
  ...book,
  readings: book.readings.filter((reading) => !isWholeOfA(reading)),
};
const lengthOfA = (fit: Pick<Fit, 'walls'>) => fit.walls.find(({ wallId }) => wallId === wallA);

describe('the whole that pieces make', () => {
  test('errs by each piece for itself and by the tape in all of them', () => {
    const plainTape = { ...tape, spec: { ...tape.spec, stepMm: 1 } } as typeof tape;
    expect(wholeOfPieces({ piecesMm: [1_210.5, 914.4, 875.1] })).toBeCloseTo(3_000, 9);
    const { uOwn, uCommon } = piecesUncertainty(plainTape, [1_210, 914, 876]);
    expect(uOwn).toBeCloseTo(0.721, 3);
    expect(uCommon).toBeCloseTo(1.212, 3);
  });

  test('is as sure as a tape drawn at random many times says', () => {
    const random = seeded(9);
    const pieces = [1_210, 914, 876];
    const ends = [1, 0, 1];
    const { uOwn, uCommon } = piecesUncertainty(tape, pieces);
    const draw = () => {
      const ofTape = random.between(-1, 1);
      return pieces.reduce((sum, piece, i) => {
        const limit = 0.3 + 0.2 * Math.ceil(piece / 1_000) + 0.2 * (ends[i] ?? 0);
        const read = random.normal() * 0.3 + random.between(-0.25, 0.25);
        return sum + ofTape * limit + read;
      }, 0);
    };
    expect(monteCarlo(8_000, draw).sd / Math.hypot(uOwn, uCommon)).toBeCloseTo(1, 1);
  });
});

describe('a wall whose whole cannot be reached', () => {
  test('is laid out by its pieces, and is hardly less sure for it', () => {
    const whole = lengthOfA(fitRoom(book, [], rules))?.length;
    const pieces = lengthOfA(
      fitRoom(withPieces(inPieces([1_200, 900, 900]), withoutWhole), [], rules),
    );
    expect(pieces?.length?.value).toBeCloseTo(whole?.value ?? 0, 0);
    expect(pieces?.length?.from).toContain(countedId(80_000));
    expect(pieces?.length?.u).toBeLessThan(1.3 * (whole?.u ?? 0));
    expect(pieces?.readAt.find(({ zMm }) => zMm === 910)?.length.kind).toBe(
      'wall-length-in-pieces',
    );
  });

  test('names the pieces when one of them slipped, and by which slip', () => {
    const slipped = withPieces(inPieces([1_200, 1_000, 900]), withoutWhole);
    const { suspect } = proveRoom(slipped, [], rules).closure;
    expect(suspect?.readings[0]).toMatchObject({
      readingIds: [countedId(80_000)],
      words: 'Wall A, 3 pieces at the counter',
      known: '100 mm',
    });
  });

  test('finds digits that were swapped within one piece, though the sum swaps none', () => {
    // 1219 typed as 1291: the sum of 3091 is no swap of 3019.
    const truly = [1_219, 881, 900];
    const typed = [1_291, 881, 900];
    expect(wholeOfPieces({ piecesMm: truly })).toBe(3_000);
    const { suspect } = proveRoom(withPieces(inPieces(typed), withoutWhole), [], rules).closure;
    expect(suspect?.readings[0]).toMatchObject({
      readingIds: [countedId(80_000)],
      known: 'digits swapped',
    });
  });
});

describe('pieces that cannot be', () => {
  test('are refused by the contract, or give finite figures and are named', () => {
    const piece = fc.oneof(
      fc.double({ min: 0, max: 5_000, noNaN: true }),
      fc.constantFrom(0, 1e-9, 99_999, -1, Number.NaN, Number.POSITIVE_INFINITY),
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 13 }), (piecesMm) => {
        const parsed = piecesReading.safeParse(inPieces(piecesMm));
        const isPlain = piecesMm.every((one) => one >= 0 && one <= 100_000);
        expect(parsed.success).toBe(isPlain && piecesMm.length >= 2 && piecesMm.length <= 12);
        const proved = proveRoom(withPieces(inPieces(piecesMm), withoutWhole), [], rules);
        expect(notNumbers(proved)).toEqual([]);
      }),
      { seed: 3, numRuns: 40 },
    );
  });
});

describe('pieces against the whole', () => {
  const verdictFor = (last: number) =>
    fitRoom(withPieces(inPieces([1_200, 900, last])), [], rules).verdicts.find(
      ({ check }) => check === 'pieces-against-whole',
    );

  test('are within the shop’s rule when they add up', () => {
    expect(verdictFor(900)).toMatchObject({ verdict: 'within', serious: false });
  });

  test('are over it at 4 mm, and past its second level at 8', () => {
    const asked = verdictFor(904);
    expect(asked).toMatchObject({ verdict: 'over', serious: false, limitMm: rules.piecesAskMm });
    expect(asked?.words).toContain('Wall A, pieces against the whole at the counter');
    expect(verdictFor(908)).toMatchObject({
      serious: true,
      action: 'No release until the pieces add up.',
    });
  });

  test('are not held against another height, nor another wall', () => {
    const low = fitRoom(withPieces(inPieces([1_200, 900, 990], 500)), [], rules);
    expect(low.verdicts.some(({ check }) => check === 'pieces-against-whole')).toBe(false);
  });

  test('share the tape’s error with the whole, so that their difference is surer than either', () => {
    const fit = fitRoom(withPieces(inPieces([1_200, 900, 900])), [], rules);
    const difference = fit.verdicts.find(({ check }) => check === 'pieces-against-whole')?.value;
    const read = lengthOfA(fit)?.readAt.filter(({ zMm }) => zMm === 910) ?? [];
    const apart = Math.hypot(...read.map(({ length }) => length.u));
    expect(difference?.u).toBeLessThan(0.8 * apart);
  });
});

describe('the plan of readings', () => {
  const planOf = (readings: Reading[]) => readingPlan({ ...book, readings }, [], rules);
  const asksOfA = (readings: Reading[]) =>
    planOf(readings).flatMap((planned) =>
      (planned.ask.kind === 'length' || planned.ask.kind === 'pieces') &&
      planned.ask.wallId === wallA
        ? [{ ...planned, ask: planned.ask }]
        : [],
    );
  const feature = (change: Partial<ReadingOf<'feature'>> = {}): ReadingOf<'feature'> => ({
    ...common,
    id: countedId(81_000),
    kind: 'feature',
    wallId: wallA,
    feature: 'other',
    x0Mm: 1_200,
    x1Mm: 2_100,
    z0Mm: 0,
    z1Mm: 1_200,
    projectionMm: 600,
    swing: 'none',
    note: '',
    ...change,
  });

  test('asks for pieces where something stands in the tape’s way at that height', () => {
    const asked = asksOfA([feature({ feature: 'radiator', projectionMm: 120 })]);
    expect(asked.map(({ ask }) => ask.kind)).toEqual(['pieces', 'pieces', 'length']);
    expect(asked[1]?.ask).toMatchObject({
      zMm: 910,
      stretches: ['piece to the radiator', 'radiator', 'piece to the corner'],
    });
  });

  test('passes in front of what hardly stands out, and over what is lower', () => {
    expect(asksOfA([feature({ projectionMm: 60 })]).every(({ ask }) => ask.kind === 'length')).toBe(
      true,
    );
    const low = asksOfA([feature({ z1Mm: 300 })]);
    expect(low.map(({ ask }) => ask.kind)).toEqual(['pieces', 'length', 'length']);
  });

  test('asks for pieces, mark to mark, when a length is given up because something is in the way', () => {
    const slot = asksOfA([]).find(({ ask }) => ask.zMm === 910)?.slot ?? '';
    const skip = (reason: string): Reading => ({
      ...common,
      id: countedId(82_000),
      kind: 'skip',
      slot,
      reason,
    });
    expect(asksOfA([skip(IN_THE_WAY)])[1]?.ask).toMatchObject({
      kind: 'pieces',
      stretches: ['piece to the mark', 'piece from the mark'],
    });
    expect(asksOfA([skip('Not built yet')])[1]).toMatchObject({
      ask: { kind: 'length' },
      skipped: { reason: 'Not built yet' },
    });
    const byWindow = [skip(IN_THE_WAY), feature({ feature: 'window', projectionMm: 0 })];
    expect(asksOfA(byWindow)[1]?.ask).toMatchObject({
      stretches: ['piece to the window', 'window', 'piece to the corner'],
    });
  });

  test('is answered by pieces or by the whole, whichever was taken', () => {
    const pieces = inPieces([1_200, 900, 900]);
    expect(asksOfA([pieces])[1]?.takenBy).toEqual([pieces.id]);
    const whole = book.readings.find((reading) => isWholeOfA(reading));
    expect(asksOfA([feature(), ...(whole ? [whole] : [])])[1]?.takenBy).toEqual([whole?.id]);
  });

  test('leaves no stretch where a thing stands in the corner', () => {
    const inCorner = asksOfA([feature({ x0Mm: 5, x1Mm: 600, feature: 'panel' })]);
    expect(inCorner[0]?.ask).toMatchObject({ stretches: ['service panel', 'piece to the corner'] });
  });
});
