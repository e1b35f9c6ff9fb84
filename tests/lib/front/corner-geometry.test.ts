import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cornerPlan } from '@/components/front/corner-geometry';

const lengthMm = fc.double({ min: 300, max: 3000, noNaN: true });

describe('cornerPlan', () => {
  it('draws the out-of-true enlarged, and no cabinet through a wall', () => {
    fc.assert(
      fc.property(
        lengthMm,
        lengthMm,
        lengthMm,
        fc.double({ min: -0.5, max: 0.5, noNaN: true }),
        (legLeftMm, legRightMm, depthMm, share) => {
          const offsetMm = share * depthMm;
          const plan = cornerPlan({ legLeftMm, legRightMm, depthMm, thetaDeg: 90, offsetMm });
          const [corner, front, back] = plan.wedge ?? [];
          const cabinet = plan.cabinet;
          if (!corner || !front || !back || !cabinet) throw new Error('a square corner has both');
          const scale = cabinet.height / depthMm;
          expect(front.x).toBeCloseTo(offsetMm * scale * plan.times, 6);
          expect(front.y).toBeCloseTo(cabinet.height, 6);
          expect(cabinet.x).toBeGreaterThanOrEqual(Math.max(0, front.x) - 1e-9);
          // The left wall passes through the front of the wedge.
          expect(plan.leftEnd.x * front.y).toBeCloseTo(plan.leftEnd.y * front.x, 3);
        },
      ),
    );
  });

  it('draws a bay as it is', () => {
    const plan = cornerPlan({
      legLeftMm: 900,
      legRightMm: 900,
      depthMm: 600,
      thetaDeg: 135,
      offsetMm: null,
    });
    expect(plan.wedge).toBeNull();
    expect(plan.leftEnd.x).toBeCloseTo(-plan.leftEnd.y, 9);
  });
});
