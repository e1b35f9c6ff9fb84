import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { matchesWords, sortRows } from '@/components/ui/sort-rows';

const self = <T>(value: T) => value;

describe('sortRows', () => {
  it('sorts house numbers as people count', () => {
    const streets = ['14 Quay Rise', '3 Salt Row', '9 Tern Street', '110 Mill Lane'];
    expect(sortRows(streets, self, false)).toEqual([
      '3 Salt Row',
      '9 Tern Street',
      '14 Quay Rise',
      '110 Mill Lane',
    ]);
  });

  it('puts what is not known last, both ways', () => {
    expect(sortRows([2, null, 1], self, false)).toEqual([1, 2, null]);
    expect(sortRows([2, null, 1], self, true)).toEqual([2, 1, null]);
  });

  it('sorts days by time', () => {
    const days = [new Date('2026-03-08'), new Date('2026-01-02')];
    expect(sortRows(days, self, false)[0]).toEqual(new Date('2026-01-02'));
  });

  it('keeps the order of rows that compare equal and leaves the given list alone', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 0, max: 3 }), { minLength: 1 }),
        fc.boolean(),
        (keys, isDescending) => {
          const rows = keys.map((key, place) => ({ key, place }));
          const before = [...rows];
          const sorted = sortRows(rows, (row) => row.key, isDescending);
          expect(rows).toEqual(before);
          sorted.reduce((above, below) => {
            const step = isDescending ? above.key - below.key : below.key - above.key;
            expect(step > 0 || (step === 0 && above.place < below.place)).toBe(true);
            return below;
          });
        },
      ),
    );
  });
});

describe('matchesWords', () => {
  it('finds every word in any order', () => {
    expect(matchesWords('Brand, Heron Court 5', 'court BRAND')).toBe(true);
    expect(matchesWords('Brand, Heron Court 5', 'court aldous')).toBe(false);
  });

  it('lets everything through when nothing is typed', () => {
    expect(matchesWords('Brand', '  ')).toBe(true);
  });
});
