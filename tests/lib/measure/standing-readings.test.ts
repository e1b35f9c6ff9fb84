import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type BookLine, standingReadings } from '@/lib/measure/standing-readings';

const read = (id: string, replaces?: string): BookLine => ({ id, kind: 'length', replaces });
const takeBack = (id: string, readingId: string): BookLine => ({
  id,
  kind: 'withdrawal',
  readingId,
});
const ids = (lines: BookLine[]) => standingReadings(lines).map(({ id }) => id);

describe('standingReadings', () => {
  it('keeps the correction and leaves out what it corrects', () => {
    expect(ids([read('a'), read('b', 'a'), read('c')])).toEqual(['b', 'c']);
  });

  it('gives a reading back when its correction is taken back', () => {
    expect(ids([read('a'), read('b', 'a'), takeBack('w', 'b')])).toEqual(['a']);
  });

  it('keeps the first reading down while a correction of its correction stands', () => {
    const chain = [read('a'), read('b', 'a'), read('c', 'b')];
    expect(ids(chain)).toEqual(['c']);
    expect(ids([...chain, takeBack('w', 'c')])).toEqual(['b']);
    expect(ids([...chain, takeBack('w', 'b')])).toEqual(['c']);
  });

  it('gives a reading back when its withdrawal is taken back', () => {
    expect(ids([read('a'), takeBack('w', 'a'), takeBack('x', 'w')])).toEqual(['a']);
  });

  it('leaves out withdrawals and skips themselves', () => {
    expect(ids([read('a'), { id: 's', kind: 'skip' }])).toEqual(['a']);
  });

  it('loses nothing to lines that strike each other or themselves', () => {
    expect(ids([read('a', 'b'), read('b', 'a'), read('c', 'c')])).toEqual(['a', 'b', 'c']);
  });

  it('does not care in which order the lines arrive', () => {
    const line = fc.record({
      kind: fc.constantFrom('length', 'withdrawal'),
      replaces: fc.option(fc.nat(9).map(String), { nil: undefined }),
      readingId: fc.option(fc.nat(9).map(String), { nil: undefined }),
    });
    const book = fc
      .array(line, { maxLength: 10 })
      .map((lines) => lines.map((one, index) => ({ ...one, id: String(index) })));
    fc.assert(
      fc.property(book, fc.integer(), (lines, seed) => {
        const shuffled = [...lines].sort(
          (one, other) => hash(one.id, seed) - hash(other.id, seed) || 1,
        );
        expect(ids(shuffled).sort()).toEqual(ids(lines).sort());
      }),
    );
  });

  it('follows a chain of ten thousand corrections', () => {
    const chain = Array.from({ length: 10_000 }, (_, index) =>
      read(String(index), index > 0 ? String(index - 1) : undefined),
    );
    expect(ids(chain)).toEqual(['9999']);
  });
});

function hash(text: string, seed: number): number {
  return ((Number(text) + 1) * 2_654_435_761 + seed * 40_503) % 1_009;
}
