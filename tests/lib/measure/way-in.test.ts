import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tiltUp } from '@/lib/measure/tilt-up';
import { passesDoor, turnsCorner } from '@/lib/measure/way-in';
import { monteCarlo, seeded } from './seeded';

const exact = (value: number) => ({ value, u: 0, from: [] });
const sure = (value: number, u: number) => ({ value, u, from: ['reading'] });
const box = (widthMm: number, depthMm: number, heightMm: number) => ({
  widthMm,
  depthMm,
  heightMm,
});

describe('through a doorway', () => {
  it('takes a tall unit lying, its two smaller sides first', () => {
    const doorway = { clearWidth: sure(762, 1), clearHeight: sure(1_981, 1) };
    const { value } = passesDoor(box(600, 580, 2_150), doorway);
    expect(value).toMatchObject({ passes: true, how: 'straight' });
    expect(value?.margin.value).toBe(182);
  });

  it('does not promise what the readings are not sure of', () => {
    const doorway = { clearWidth: sure(581, 1), clearHeight: sure(1_981, 1) };
    const { value } = passesDoor(box(600, 580, 2_150), doorway);
    expect(value?.passes).toBe(false);
    expect(value?.words).toMatch(/less than the readings are sure of/);
  });

  it('leans a panel through an opening lower than the panel', () => {
    const opening = { clearWidth: exact(1_000), clearHeight: exact(1_000) };
    expect(passesDoor(box(60, 1_300, 1_300), opening).value).toMatchObject({
      passes: true,
      how: 'leaning',
    });
    expect(passesDoor(box(60, 1_500, 1_500), opening).value?.passes).toBe(false);
  });

  it('leans exactly what a turned rectangle in a rectangle can', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 20, max: 400 }),
        fc.integer({ min: 900, max: 1_600 }),
        fc.integer({ min: 500, max: 1_000 }),
        fc.integer({ min: 700, max: 1_200 }),
        (thin, middle, width, height) => {
          const { value } = passesDoor(box(thin, middle, 5_000), {
            clearWidth: exact(width),
            clearHeight: exact(height),
          });
          let fits = false;
          for (let step = 0; step <= 9_000; step++) {
            const turn = (step * Math.PI) / 18_000;
            const wide = middle * Math.sin(turn) + thin * Math.cos(turn);
            const high = middle * Math.cos(turn) + thin * Math.sin(turn);
            if (wide <= width && high <= height) fits = true;
          }
          if (Math.abs(value?.margin.value ?? 0) > 0.5) expect(value?.passes).toBe(fits);
        },
      ),
      { numRuns: 60, seed: 3 },
    );
  });
});

describe('round the corner of a passage', () => {
  it('turns a thin board by the ladder’s rule', () => {
    const passage = { widthIn: exact(1_000), widthOut: exact(1_000), clearHeight: exact(2_000) };
    const { value } = turnsCorner(box(2_800, 0.001, 1_900), passage);
    expect(value?.passes).toBe(true);
    expect(value?.margin.value).toBeCloseTo(28.4, 0);
  });

  it('lets a short box slide in without turning', () => {
    const passage = { widthIn: exact(900), widthOut: exact(1_300), clearHeight: exact(2_000) };
    const { value } = turnsCorner(box(1_250, 850, 1_900), passage);
    expect(value).toMatchObject({ passes: true, how: 'sliding', upright: 'heightMm' });
    expect(value?.margin.value).toBe(50);
  });

  it('stands a long box up when it is too long to turn', () => {
    const passage = { widthIn: exact(900), widthOut: exact(900), clearHeight: exact(2_400) };
    const { value } = turnsCorner(box(600, 580, 2_150), passage);
    expect(value).toMatchObject({ passes: true, upright: 'heightMm' });
    const low = { ...passage, clearHeight: exact(2_100) };
    expect(turnsCorner(box(600, 580, 2_150), low).value?.passes).toBe(false);
  });

  it('agrees with a slow search over all angles', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 700, max: 1_500 }),
        fc.integer({ min: 700, max: 1_500 }),
        fc.integer({ min: 100, max: 650 }),
        (p, q, thickness) => {
          let reach = Number.POSITIVE_INFINITY;
          for (let step = 1; step < 20_000; step++) {
            const angle = (step * Math.PI) / 40_000;
            const [sin, cos] = [Math.sin(angle), Math.cos(angle)];
            reach = Math.min(reach, (p * sin + q * cos - thickness) / (sin * cos));
          }
          const passage = { widthIn: exact(p), widthOut: exact(q), clearHeight: exact(2_000) };
          const long = turnsCorner(box(reach + 20, thickness, 1_990), passage).value;
          const short = turnsCorner(box(reach - 20, thickness, 1_990), passage).value;
          expect(short?.passes).toBe(true);
          expect(long?.how).not.toBe('turning');
        },
      ),
      { numRuns: 25, seed: 4 },
    );
  });

  it('states the u that turning shows', () => {
    const random = seeded(9);
    const sizes = box(1_500, 500, 1_990);
    const passage = (p: number, q: number, u: number) => ({
      widthIn: sure(p, u),
      widthOut: sure(q, u),
      clearHeight: null,
    });
    const { value } = turnsCorner(sizes, passage(1_100, 1_050, 2));
    const { sd } = monteCarlo(2_000, () => {
      const drawn = passage(1_100 + 2 * random.normal(), 1_050 + 2 * random.normal(), 0);
      return turnsCorner(sizes, drawn).value?.margin.value ?? Number.NaN;
    });
    expect(value?.how).toBe('turning');
    expect(Math.abs((value?.margin.u ?? 0) / sd - 1)).toBeLessThan(0.06);
  });

  it('refuses sizes that cannot be', () => {
    const passage = { widthIn: exact(Number.NaN), widthOut: exact(900), clearHeight: null };
    expect(turnsCorner(box(1, 1, 1), passage).problems[0]?.code).toBe('size-impossible');
    expect(
      passesDoor(box(0, 1, 1), { clearWidth: exact(1), clearHeight: exact(1) }).value,
    ).toBeNull();
  });
});

describe('standing a tall unit up', () => {
  const unit = { heightMm: 2_150, widthMm: 600, depthMm: 580, kickMm: 150, kickComesOff: true };
  const room = (clear: number) => ({
    unit,
    clearWhereTilted: sure(clear, 1),
    clearWhereItStands: sure(clear, 1),
    marginMm: 12,
    liftMm: 10,
  });

  it('needs the diagonal over its smaller side, and a margin', () => {
    const { value } = tiltUp(room(2_400));
    expect(value?.diagonalMm).toBeCloseTo(Math.hypot(2_150, 580), 9);
    expect(value?.tiltMargin.value).toBeCloseTo(2_400 - 12 - Math.hypot(2_150, 580), 9);
    expect(value?.standMargin.value).toBe(90);
    expect(value).toMatchObject({ standsUp: true, helps: [] });
  });

  it('counts a kick that is built on while tilting, and says what taking it off would do', () => {
    const fixed = { ...room(2_320), unit: { ...unit, kickComesOff: false } };
    const { value } = tiltUp(fixed);
    expect(value?.standsUp).toBe(false);
    expect(value?.helps[0]).toMatch(/kick base loose/);
    expect(tiltUp(room(2_320)).value?.standsUp).toBe(true);
  });

  it('leaves no doubt: the margin must exceed its U', () => {
    const just = Math.hypot(2_150, 580) + 12;
    expect(tiltUp({ ...room(2_400), clearWhereTilted: sure(just + 1.9, 1) }).value?.standsUp).toBe(
      false,
    );
    expect(tiltUp({ ...room(2_400), clearWhereTilted: sure(just + 2.1, 1) }).value?.standsUp).toBe(
      true,
    );
  });

  it('refuses a room of no height', () => {
    expect(tiltUp(room(0)).problems[0]?.code).toBe('size-impossible');
  });
});
