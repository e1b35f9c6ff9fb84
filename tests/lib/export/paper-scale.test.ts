import { describe, expect, it } from 'vitest';
import type { Drawing } from '@/lib/drawing/shape';
import { drawnToScale } from '@/lib/export/paper-scale';

const ptPerPx = 0.56;
/** A wall with a margin that does not grow with the scale, as figures do not. */
function wallOf(lengthMm: number) {
  return ({ pxPerMm }: { pxPerMm: number }): Drawing => ({
    shapes: [],
    bounds: { left: 0, top: 0, width: lengthMm * pxPerMm + 150, height: 200 },
    exaggeration: 1,
    pxPerMm,
  });
}
const page = { width: 500, height: 400, ptPerPx };

describe('drawnToScale', () => {
  it('takes the largest usual scale that goes on the page', () => {
    const { scale } = drawnToScale(wallOf(3600), { unit: 'mm', ...page });
    expect(scale?.ratio).toBe(25);
    const larger = 3600 * (72 / 25.4 / 20) + 150 * ptPerPx;
    expect(larger).toBeGreaterThan(page.width);
  });

  it('takes an architect’s scale in inch shops', () => {
    const { scale } = drawnToScale(wallOf(3600), { unit: 'in', ...page });
    expect(scale?.words).toBe('3/8" to the foot (1:32)');
  });

  it('draws a millimetre of the room as long as the scale says', () => {
    const { drawing, scale } = drawnToScale(wallOf(2400), { unit: 'mm', ...page });
    const paperMm = (drawing.pxPerMm * ptPerPx * 25.4) / 72;
    expect(1 / paperMm).toBeCloseTo(scale?.ratio ?? 0, 6);
  });

  it('fits what goes at no scale, and then names none', () => {
    const found = drawnToScale(wallOf(500_000), { unit: 'mm', ...page });
    expect(found.scale).toBeNull();
    expect(found.drawing.bounds.width * found.ptPerPx).toBeLessThanOrEqual(page.width + 1e-9);
  });
});
