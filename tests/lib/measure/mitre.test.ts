import { describe, expect, it } from 'vitest';
import { crownMitre, halfMitre } from '@/lib/measure/mitre';
import { monteCarlo, seeded } from './seeded';

const exact = (value: number) => ({ value, u: 0, from: [] });

describe('saw angles', () => {
  it('halves a corner and reads the saw from square', () => {
    const { value } = halfMitre({ value: 91, u: 0.2, from: ['c'] });
    expect(value?.piece).toEqual({ value: 45.5, u: 0.1, U: 0.2, from: ['c'] });
    expect(value?.saw.value).toBe(44.5);
  });

  it('cuts an outside corner like the inside one that completes the turn', () => {
    expect(halfMitre(exact(270)).value?.saw.value).toBe(45);
    const [inside, outside] = [crownMitre(exact(38), exact(88)), crownMitre(exact(38), exact(272))];
    expect(outside.value?.mitre.value).toBeCloseTo(inside.value?.mitre.value ?? 0, 9);
    expect(outside.value?.bevel.value).toBeCloseTo(inside.value?.bevel.value ?? 0, 9);
    expect([inside.value?.corner, outside.value?.corner]).toEqual(['inside', 'outside']);
  });

  it('needs no cut on a straight wall', () => {
    const { value } = crownMitre(exact(38), exact(180));
    expect(value?.mitre.value).toBeCloseTo(0, 12);
    expect(value?.bevel.value).toBeCloseTo(0, 12);
  });

  it.each([87, 135, 268])('states the u that its angles show at %d°', (corner) => {
    const random = seeded(corner);
    const { value } = crownMitre(
      { value: 38, u: 0.5, from: [] },
      { value: corner, u: 0.4, from: [] },
    );
    const draw = (kind: 'mitre' | 'bevel') =>
      monteCarlo(4_000, () => {
        const cut = crownMitre(
          exact(38 + 0.5 * random.normal()),
          exact(corner + 0.4 * random.normal()),
        );
        return cut.value?.[kind].value ?? Number.NaN;
      });
    for (const kind of ['mitre', 'bevel'] as const) {
      expect(Math.abs((value?.[kind].u ?? 0) / draw(kind).sd - 1)).toBeLessThan(0.05);
    }
  });

  it.each([0, 360, -5, Number.NaN])('refuses a corner of %d°', (corner) => {
    expect(halfMitre(exact(corner)).problems[0]?.code).toBe('angle-impossible');
    expect(crownMitre(exact(38), exact(corner)).value).toBeNull();
  });

  it('refuses a spring of 90°', () => {
    expect(crownMitre(exact(90), exact(90)).value).toBeNull();
  });
});
