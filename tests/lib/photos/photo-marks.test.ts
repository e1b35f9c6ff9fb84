import { describe, expect, it } from 'vitest';
import { fitWithin } from '@/lib/photos/fit-within';
import { captionOf, markOf, markPath, markSizes } from '@/lib/photos/photo-marks';

const size = { widthPx: 2000, heightPx: 1000 };

describe('marks on a photo', () => {
  it('a circle drawn out reaches the finger, at whatever shape the picture is', () => {
    const drag = { from: { x: 0.5, y: 0.5 }, to: { x: 0.75, y: 0.5 } };
    expect(markOf('circle', drag, size)).toEqual({ kind: 'circle', at: drag.from, radius: 0.25 });
    const down = { from: { x: 0.5, y: 0.5 }, to: { x: 0.5, y: 1 } };
    expect(markOf('circle', down, size)).toMatchObject({ radius: 0.25 });
  });

  it('a touch gives a circle and an arrow of the usual size', () => {
    const touch = { from: { x: 0.5, y: 0.5 }, to: { x: 0.505, y: 0.5 } };
    expect(markOf('circle', touch, size)).toMatchObject({ radius: 0.06 });
    expect(markOf('arrow', touch, size)).toEqual({
      kind: 'arrow',
      from: { x: 0.385, y: 0.62 },
      to: touch.to,
    });
  });

  it('an arrow points where the finger went up, and stays inside the picture', () => {
    const drag = { from: { x: 0.9, y: 0.9 }, to: { x: 1.4, y: -0.2 } };
    expect(markOf('arrow', drag, size)).toEqual({
      kind: 'arrow',
      from: drag.from,
      to: { x: 1, y: 0 },
    });
  });

  it('lines are in points of the picture, the same on screen and in the file', () => {
    const circle = markPath({ kind: 'circle', at: { x: 0.5, y: 0.5 }, radius: 0.1 }, size);
    expect(circle).toBe('M800 500A200 200 0 1 0 1200 500A200 200 0 1 0 800 500Z');
    const arrow = markPath({ kind: 'arrow', from: { x: 0, y: 0.5 }, to: { x: 0.5, y: 0.5 } }, size);
    // Both barbs lie behind the tip, one on each side.
    expect(arrow).toBe('M0 500L1000 500M947.3 471.2L1000 500L947.3 528.8');
    expect(markPath({ kind: 'words', at: { x: 0, y: 0 }, words: '34 1/2"' }, size)).toBe('');
  });

  it('lines and words can be seen on a small picture too', () => {
    expect(markSizes({ widthPx: 100, heightPx: 80 })).toEqual({ linePx: 2, wordsPx: 12 });
    expect(markSizes({ widthPx: 2048, heightPx: 1536 }).wordsPx).toBeCloseTo(73.1, 1);
  });

  it('the caption says where, and the figures on it', () => {
    const words = (text: string) => ({ kind: 'words' as const, at: { x: 0, y: 0 }, words: text });
    expect(captionOf('Wall B', [words('95 1/16"'), words('34"')])).toBe('Wall B: 95 1/16", 34"');
    expect(captionOf('Wall B', [])).toBe('Wall B');
    expect(captionOf('Wall B', [words('9'.repeat(400))])).toHaveLength(300);
  });

  it('a photo is kept at its own size or scaled to its longer side', () => {
    expect(fitWithin({ widthPx: 4032, heightPx: 3024 }, 2048)).toEqual({
      widthPx: 2048,
      heightPx: 1536,
    });
    expect(fitWithin({ widthPx: 640, heightPx: 480 }, 2048)).toEqual({
      widthPx: 640,
      heightPx: 480,
    });
    expect(fitWithin({ widthPx: 10, heightPx: 9000 }, 2048)).toEqual({
      widthPx: 2,
      heightPx: 2048,
    });
  });
});
