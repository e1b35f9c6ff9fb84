import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chordAngle } from '@/lib/measure/chord-angle';
import { type CornerLegs, cornerAngle, cornerOffset } from '@/lib/measure/corner';
import { cornerDeviation, cornerTwist } from '@/lib/measure/corner-deviation';
import { figure } from '@/lib/measure/figure';
import { monteCarlo, seeded } from './seeded';

const legs = (
  a: number,
  b: number,
  c: number,
  more: Partial<CornerLegs> = {},
  u = 0.5,
): CornerLegs => ({
  method: 'legs',
  legLeft: { id: 'left', value: a, u },
  legRight: { id: 'right', value: b, u },
  diagonal: { id: 'diagonal', value: c, u },
  carriedPast: false,
  ...more,
});
const diagonalOf = (a: number, b: number, deg: number) =>
  Math.sqrt(a * a + b * b - 2 * a * b * Math.cos((deg * Math.PI) / 180));
const codeOf = (input: Parameters<typeof cornerAngle>[0]) => cornerAngle(input).problems[0]?.code;

describe('cornerAngle', () => {
  it('takes 900, 1200 and 1500 as square', () => {
    const { value, problems } = cornerAngle(legs(900, 1200, 1500));
    expect(value?.value).toBeCloseTo(90, 9);
    expect(value?.u).toBeCloseTo(0.0563, 4);
    expect(value?.from).toEqual(['left', 'right', 'diagonal']);
    expect(problems).toEqual([]);
  });

  it('names one reading once when it carries all three lengths', () => {
    const one = (value: number) => ({ id: 'r', value, u: 0.5 });
    const input = { ...legs(0, 0, 0), legLeft: one(900), legRight: one(1200), diagonal: one(1500) };
    expect(cornerAngle(input).value?.from).toEqual(['r']);
  });

  it('gives back any angle between too sharp and too flat', () => {
    const leg = fc.double({ min: 600, max: 3000, noNaN: true });
    fc.assert(
      fc.property(
        leg,
        leg,
        fc.double({ min: 16, max: 164, noNaN: true }),
        fc.boolean(),
        (a, b, deg, carriedPast) => {
          const outcome = cornerAngle(legs(a, b, diagonalOf(a, b, deg), { carriedPast }));
          if (carriedPast ? deg > 164 : deg < 16) return;
          expect(outcome.value?.value).toBeCloseTo(carriedPast ? 180 + deg : deg, 6);
        },
      ),
    );
  }, 30_000);

  it('takes an outside corner with the leg carried past it', () => {
    const { value } = cornerAngle(legs(900, 1200, 1500, { carriedPast: true }));
    expect(value?.value).toBeCloseTo(270, 9);
  });

  it.each([60, 90, 135])(
    'states at %d° the spread that Monte Carlo finds',
    (deg) => {
      const random = seeded(deg);
      const [a, b] = [900, 1100];
      const c = diagonalOf(a, b, deg);
      const drawn = () =>
        legs(a + 0.7 * random.normal(), b + 0.7 * random.normal(), c + 0.7 * random.normal());
      const { mean, sd } = monteCarlo(
        20_000,
        () => cornerAngle(drawn()).value?.value ?? Number.NaN,
      );
      const stated = cornerAngle(legs(a, b, c, {}, 0.7)).value?.u ?? 0;
      expect(mean).toBeCloseTo(deg, 2);
      expect(sd / stated).toBeGreaterThan(0.97);
      expect(sd / stated).toBeLessThan(1.03);
    },
    30_000,
  );

  it('is on the safe side of an error the tape makes in all three readings', () => {
    const random = seeded(7);
    const drawn = () => {
      const same = 0.5 * random.normal();
      return legs(900 + same, 1200 + same, 1500 + same);
    };
    const { sd } = monteCarlo(5_000, () => cornerAngle(drawn()).value?.value ?? Number.NaN);
    expect(sd).toBeLessThan(cornerAngle(legs(900, 1200, 1500)).value?.u ?? 0);
  }, 30_000);

  it('warns on short legs and says which longer ones would halve U', () => {
    const { value, problems } = cornerAngle(legs(300, 400, 500));
    expect(problems).toMatchObject([{ code: 'short-legs', severity: 'warning' }]);
    expect(problems[0]?.message).toContain('600 mm (23 5/8") and 800 mm (31 1/2")');
    const longer = cornerAngle(legs(600, 800, 1000)).value;
    expect(longer?.U).toBeCloseTo((value?.U ?? 0) / 2, 9);
  });

  it('counts the tape in the advice on longer legs', () => {
    const uOfLength = (lengthMm: number) => 0.2 + lengthMm / 4000;
    const { value, problems } = cornerAngle(legs(300, 400, 500, { uOfLength }, 0.3));
    expect(problems[0]?.message).not.toContain('600 mm');
    const [left = 0, right = 0] = [...(problems[0]?.message.matchAll(/(\d+) mm/g) ?? [])].map(
      ([, mm]) => Number(mm),
    );
    const longer = legs(left, right, Math.hypot(left, right));
    expect(left).toBeGreaterThan(900);
    for (const read of [longer.legLeft, longer.legRight, longer.diagonal])
      read.u = uOfLength(read.value);
    expect(cornerAngle(longer).value?.U).toBeLessThanOrEqual((value?.U ?? 0) / 2);
  });

  it('refuses readings that cannot be true, naming them', () => {
    const long = cornerAngle(legs(900, 1200, 2110));
    expect(long).toMatchObject({
      value: null,
      problems: [{ code: 'diagonal-too-long', about: ['left', 'right', 'diagonal'] }],
    });
    expect(codeOf(legs(900, 1200, 290))).toBe('diagonal-too-short');
    expect(codeOf(legs(0, 1200, 1500))).toBe('leg-not-positive');
    expect(codeOf(legs(-900, 1200, 1500))).toBe('leg-not-positive');
    expect(codeOf(legs(Number.NaN, 1200, 1500))).toBe('reading-not-a-number');
    expect(codeOf(legs(900, 1200, Infinity))).toBe('reading-not-a-number');
    expect(codeOf(legs(900, 1200, 1500, {}, Number.NaN))).toBe('uncertainty-not-known');
  });

  it('says when a corner is too flat for a diagonal, or too sharp to be one', () => {
    expect(codeOf(legs(900, 1200, 2100))).toBe('too-flat');
    expect(codeOf(legs(900, 1200, 2100.2))).toBe('too-flat');
    expect(codeOf(legs(900, 900, diagonalOf(900, 900, 170)))).toBe('too-flat');
    expect(codeOf(legs(900, 900, diagonalOf(900, 900, 10), { carriedPast: true }))).toBe(
      'too-flat',
    );
    expect(codeOf(legs(900, 900, diagonalOf(900, 900, 10)))).toBe('too-sharp');
    expect(codeOf(legs(900, 900, diagonalOf(900, 900, 170), { carriedPast: true }))).toBe(
      'too-sharp',
    );
  });

  it('takes an angle finder as it reads, and refuses what is no angle', () => {
    const angle = (value: number) =>
      ({ method: 'angle', angle: { id: 'r', value, u: 0.1 } }) as const;
    expect(cornerAngle(angle(91.3)).value).toEqual(figure(91.3, 0.1, ['r']));
    expect(codeOf(angle(0))).toBe('angle-out-of-range');
    expect(codeOf(angle(360))).toBe('angle-out-of-range');
    expect(codeOf(angle(Number.NaN))).toBe('reading-not-a-number');
  });

  it('never throws and never gives NaN, whatever is read', () => {
    const any = fc.oneof(
      fc.double(),
      fc.double({ min: 1, max: 3000 }),
      fc.constantFrom(0, -1, 900, 1200, 1500),
    );
    fc.assert(
      fc.property(any, any, any, any, fc.boolean(), (a, b, c, u, carriedPast) => {
        const { value, problems } = cornerAngle(legs(a, b, c, { carriedPast }, u));
        if (value === null) return problems.some(({ severity }) => severity === 'error');
        return (
          Number.isFinite(value.value) &&
          Number.isFinite(value.u) &&
          value.value > 0 &&
          value.value < 360
        );
      }),
      { numRuns: 20_000 },
    );
  }, 30_000);
});

describe('cornerOffset', () => {
  it('is in the way at the front of a closed corner and clear at an open one', () => {
    const closed = cornerOffset(figure(89.5, 0.1, ['r']), 600).value;
    expect(closed?.value).toBeCloseTo(5.236, 3);
    expect(closed?.u).toBeCloseTo(1.047, 3);
    expect(cornerOffset(figure(90.5, 0.1, []), 600).value?.value).toBeCloseTo(-5.236, 3);
    expect(cornerOffset(figure(90, 0.1, []), 600).value?.value).toBeCloseTo(0, 9);
    expect(cornerOffset(figure(135, 0.1, []), 600).value?.value).toBeCloseTo(-600, 9);
  });

  it('has no offset where the end is open', () => {
    expect(cornerOffset(figure(180, 0.1, ['r']), 600)).toMatchObject({
      value: null,
      problems: [{ code: 'end-open', about: ['r'] }],
    });
    expect(cornerOffset(figure(270, 0.1, []), 600).problems[0]?.code).toBe('end-open');
    expect(cornerOffset(figure(0, 0.1, []), 600).problems[0]?.code).toBe('angle-out-of-range');
    expect(cornerOffset(figure(Number.NaN, 0.1, []), 600).problems[0]?.code).toBe(
      'angle-out-of-range',
    );
    expect(cornerOffset(figure(90, 0.1, []), -1).problems[0]?.code).toBe('depth-not-positive');
  });

  it('states the spread that Monte Carlo finds', () => {
    const random = seeded(11);
    const { sd } = monteCarlo(
      20_000,
      () => cornerOffset(figure(88 + 0.2 * random.normal(), 0, []), 600).value?.value ?? Number.NaN,
    );
    const stated = cornerOffset(figure(88, 0.2, []), 600).value?.u ?? 0;
    expect(Math.abs(sd / stated - 1)).toBeLessThan(0.03);
  }, 30_000);
});

describe('cornerDeviation and cornerTwist', () => {
  it('says open, closed, or true within the reading', () => {
    expect(cornerDeviation(figure(90.4, 0.1, []), 90).lies).toBe('open');
    expect(cornerDeviation(figure(89.6, 0.1, []), 90).lies).toBe('closed');
    expect(cornerDeviation(figure(90.15, 0.1, []), 90).lies).toBe('true-within-the-reading');
    expect(cornerDeviation(figure(269.5, 0.1, []), 270).deviation.value).toBeCloseTo(-0.5, 9);
  });

  it('keeps every height and reports the twist between the extremes', () => {
    const twist = cornerTwist([
      figure(89.6, 0.1, ['floor']),
      figure(90, 0.1, ['middle']),
      figure(90.1, 0.1, ['top']),
    ]);
    expect(twist?.value).toBeCloseTo(0.5, 9);
    expect(twist?.u).toBeCloseTo(Math.SQRT2 * 0.1, 9);
    expect(twist?.from).toEqual(['top', 'floor']);
    expect(cornerTwist([figure(90, 0.1, [])])).toBeNull();
  });
});

describe('chordAngle', () => {
  const arm = { armMm: 900, proud: null, wallLengthMm: 3000, usualBowMm: 3 };

  it('adds what the marks stand proud of the straight line corner to corner', () => {
    const proud = { ...arm, proud: { id: 'row', value: 2, u: 0.3 } };
    const chord = chordAngle(figure(89.8, 0.1, ['r']), { left: proud, right: proud });
    expect(chord.value).toBeCloseTo(90.0546, 4);
    expect(chord.u).toBeCloseTo(
      Math.hypot(0.1, (0.3 / 900) * (180 / Math.PI), (0.3 / 900) * (180 / Math.PI)),
      9,
    );
    expect(chord.from).toEqual(['r', 'row']);
  });

  it('finds the chord of walls bowed as a parabola, by drawing them', () => {
    const bowAt = (bow: number, length: number, x: number) =>
      4 * bow * (x / length) * (1 - x / length);
    const [left, right] = [bowAt(4, 3000, 900), bowAt(-3, 2500, 900)];
    // Chords at 90°: right arm along +x, left arm along +y; each mark stands off its chord into the room.
    const [leftMark, rightMark] = [
      { x: left, y: 900 },
      { x: 900, y: right },
    ];
    const seen =
      (Math.atan2(leftMark.y, leftMark.x) - Math.atan2(rightMark.y, rightMark.x)) * (180 / Math.PI);
    const chord = chordAngle(figure(seen, 0, []), {
      left: { ...arm, proud: { id: 'l', value: left, u: 0 } },
      right: { ...arm, proud: { id: 'r', value: right, u: 0 } },
    });
    expect(chord.value).toBeCloseTo(90, 4);
  });

  it('grows unsure by the usual bow where no row was read, and not for an arm as long as the wall', () => {
    const one = (((4 * 3) / 3000) * (1 - 900 / 3000) * (180 / Math.PI)) / Math.sqrt(3);
    expect(chordAngle(figure(90, 0.1, []), { left: arm, right: arm }).u).toBeCloseTo(
      Math.hypot(0.1, one, one),
      9,
    );
    const whole = { ...arm, armMm: 3000 };
    expect(chordAngle(figure(90, 0.1, []), { left: whole, right: whole }).u).toBeCloseTo(0.1, 12);
  });
});
