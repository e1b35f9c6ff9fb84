import { describe, expect, it } from 'vitest';
import { penStrokes } from '@/lib/contracts/sign-offs';
import { keptStrokes } from '@/lib/signing/kept-strokes';
import { strokePath } from '@/lib/signing/stroke-path';

const line = (count: number): [number, number][] =>
  Array.from({ length: count }, (_, at) => [at % 700, (at * 7) % 400]);

describe('a signature on the glass', () => {
  it.each([
    ['a name', [line(80), line(30)]],
    ['a scribble without end', [line(50_000)]],
    ['a thousand dots', Array.from({ length: 1_000 }, () => line(1))],
    ['many long strokes', Array.from({ length: 40 }, () => line(1_500))],
  ])('is taken as it is drawn: %s', (_what, strokes) => {
    const kept = keptStrokes(strokes);
    expect(penStrokes.safeParse(kept).success).toBe(true);
    expect(kept[0]?.[0]).toEqual([0, 0]);
  });

  it('is no signature when nothing was drawn', () => {
    expect(penStrokes.safeParse(keptStrokes([[]])).success).toBe(false);
  });

  it('is drawn again as one path, a dot as a line of no length', () => {
    expect(
      strokePath([
        [
          [1, 2],
          [3, 4],
        ],
        [[5, 5]],
      ]),
    ).toBe('M1 2L3 4M5 5L5 5');
  });
});
