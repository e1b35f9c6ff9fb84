import { describe, expect, it } from 'vitest';
import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import { otherReaders } from '@/lib/walls-pad/other-readers';
import {
  exampleBook,
  exampleLength,
  exampleTape,
  id,
  metricRules,
  wallIds,
} from '@/tests/help/wall-book-examples';

const speech = { unit: 'mm' as const, stepMm: 1 };
const mine = exampleLength(1, { valueMm: 4_000, zMm: 900 });

const ann = (...readings: Reading[]) => ({
  personId: 'ann',
  name: 'Ann Field',
  readingIds: readings.map((each) => each.id),
});

function others(reading: Reading, theirs: Reading[], readers = [ann(...theirs)]) {
  return otherReaders(reading, {
    book: exampleBook([reading, ...theirs]),
    readers,
    ownPersonId: 'bo',
    rules: metricRules,
    speech,
  });
}

const corner = (number: number, angleDeg: number): ReadingOf<'corner'> => ({
  ...base(number),
  kind: 'corner',
  cornerWallId: wallIds.B,
  zMm: 900,
  by: { method: 'angle', angleDeg },
});
const base = (number: number) => ({
  id: id(number),
  roomId: id(1),
  toolId: exampleTape.id,
  takenAt: '2026-12-01T10:00:00.000Z',
  typed: '',
  unit: 'mm' as const,
  touches: 'board' as const,
});

describe('a second person’s reading of the same thing', () => {
  it('is shown with the name and the difference', () => {
    const theirs = exampleLength(2, { valueMm: 4_005, zMm: 910 });
    expect(others(mine, [theirs])).toEqual([
      {
        readingId: theirs.id,
        name: 'Ann Field',
        value: '4005 mm',
        difference: '5 mm more',
        isApart: true,
      },
    ]);
    // Looked at from theirs, a reading that the office has not named anybody for is one's own.
    expect(others(theirs, [mine], [ann(theirs)])).toEqual([
      expect.objectContaining({ name: 'You', difference: '5 mm less' }),
    ]);
    const bo = { personId: 'bo', name: 'Bo Marsh', readingIds: [mine.id] };
    expect(others(theirs, [mine], [ann(theirs), bo])[0]?.name).toBe('Bo Marsh');
  });

  it('agrees when it is no further off than the shop allows', () => {
    const theirs = exampleLength(2, { valueMm: 4_001, zMm: 900 });
    expect(others(mine, [theirs])[0]).toMatchObject({ difference: '1 mm more', isApart: false });
    const same = exampleLength(3, { valueMm: 4_000, zMm: 900 });
    expect(others(mine, [same])[0]).toMatchObject({ difference: 'the same', isApart: false });
  });

  it('is not one’s own repeat, nor one at another height, nor one that was taken back', () => {
    const again = exampleLength(2, { valueMm: 4_002, zMm: 900 });
    expect(others(mine, [again], [])).toEqual([]);
    expect(others(mine, [exampleLength(3, { valueMm: 4_005, zMm: 1_450 })])).toEqual([]);
    const theirs = exampleLength(4, { valueMm: 4_005, zMm: 900 });
    const back: Reading = {
      ...base(5),
      kind: 'withdrawal',
      readingId: theirs.id,
      reason: 'Misread',
    };
    expect(others(mine, [theirs, back])).toEqual([]);
  });

  it('is held in degrees at a corner, however each of the two took it', () => {
    const legs: ReadingOf<'corner'> = {
      ...corner(7, 90),
      by: {
        method: 'legs',
        legLeftMm: 600,
        legRightMm: 800,
        diagonalMm: 1_000,
        carriedPast: false,
      },
    };
    expect(others(corner(6, 89.4), [legs])[0]).toMatchObject({
      difference: '0.6° more',
      isApart: true,
    });
    expect(others(corner(6, 90.1), [legs])[0]).toMatchObject({ isApart: false });
  });

  it('takes the figure of a window or doorway that differs most', () => {
    const window = (number: number, change: Partial<ReadingOf<'feature'>>): Reading => ({
      ...base(number),
      kind: 'feature',
      wallId: wallIds.A,
      feature: 'window',
      x0Mm: 1_000,
      x1Mm: 2_000,
      z0Mm: 1_000,
      z1Mm: 2_000,
      projectionMm: 0,
      swing: 'none',
      note: '',
      ...change,
    });
    expect(others(window(8, {}), [window(9, { x0Mm: 1_001, x1Mm: 1_990 })])[0]).toMatchObject({
      difference: '10 mm less',
      isApart: true,
    });
    expect(others(window(8, {}), [window(9, { x0Mm: 2_100, x1Mm: 2_600 })])).toEqual([]);
  });

  it('of a gap or a drop is of another set-up, and is not held against it', () => {
    const drop = (number: number, dropMm: number): Reading => ({
      ...base(number),
      kind: 'floor',
      wallId: wallIds.A,
      xMm: 0,
      yMm: 0,
      dropMm,
      setUpId: id(50 + number),
    });
    expect(others(drop(1, 900), [drop(2, 955)])).toEqual([]);
  });
});
