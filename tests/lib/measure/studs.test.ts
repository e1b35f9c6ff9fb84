import { describe, expect, it } from 'vitest';
import { studGrid } from '@/lib/measure/stud-spacing';
import { type StudInput, studCatch } from '@/lib/measure/studs';
import { seeded } from './seeded';

const at = (xs: number[], u = 3) =>
  xs.map((xMm, i) => ({ id: `stud ${i}`, xMm, u, at: 'centre' as const }));

const input = (more: Partial<StudInput>): StudInput => ({
  studs: at([102, 508, 914, 1_321]),
  units: [],
  openings: [],
  wallLengthMm: 3_000,
  spacingsMm: [400, 406.4, 600, 609.6],
  studWidthMm: 38,
  screwEdgeMm: 19,
  studsNeeded: [
    { toWidthMm: 450, studs: 1 },
    { toWidthMm: 990, studs: 2 },
    { toWidthMm: 1_220, studs: 3 },
  ],
  ...more,
});

describe('studs behind hung units', () => {
  it('tells 16 inch from 400 mm over four studs and predicts the rest of the wall', () => {
    const { value } = studCatch(input({}));
    expect(value?.spacingMm).toBe(406.4);
    const predicted = value?.studs.filter((stud) => stud.predicted) ?? [];
    expect(predicted.map(({ xMm }) => Math.round(xMm))).toEqual([1_727, 2_134, 2_540, 2_946]);
  });

  it('states nothing while two spacings fit', () => {
    const { value } = studCatch(input({ studs: at([100, 502, 905], 8) }));
    expect(value?.spacingMm).toBeNull();
    expect(value?.studs).toHaveLength(3);
  });

  it('ignores an odd stud beside an opening', () => {
    const { value } = studCatch(input({ studs: at([102, 508, 640, 914, 1_321]) }));
    expect(value?.spacingMm).toBe(406.4);
    expect(value?.studs.filter(({ xMm }) => xMm === 640)).toHaveLength(1);
  });

  it('predicts nothing across an opening', () => {
    const { value } = studCatch(input({ openings: [{ x0Mm: 1_600, x1Mm: 2_400 }] }));
    expect(value?.studs.filter((stud) => stud.predicted)).toEqual([]);
  });

  it('counts a stud only inside the rail less the screw’s edge', () => {
    const unit = (leftMm: number, rightMm: number) => ({ unitId: 'u', leftMm, rightMm });
    const catchOf = (leftMm: number, rightMm: number) =>
      studCatch(input({ units: [unit(leftMm, rightMm)] })).value?.units[0];
    expect(catchOf(450, 1_210)).toMatchObject({ needed: 2, enough: true });
    expect(catchOf(500, 920)).toMatchObject({ needed: 1, enough: false });
    expect(catchOf(500, 920)?.words).toMatch(/needs backing or a rail; ask the shop/);
    expect(catchOf(489, 933)?.studs.map(({ xMm }) => xMm)).toEqual([508, 914]);
  });

  it('reads a stud by its edge', () => {
    const { value } = studCatch(
      input({
        studs: [
          { id: 'a', xMm: 100, u: 3, at: 'left-edge' },
          { id: 'b', xMm: 538, u: 3, at: 'right-edge' },
        ],
      }),
    );
    expect(value?.studs.map(({ xMm }) => xMm)).toEqual([119, 519]);
  });

  it('predicts no second stud beside one that stands off the row', () => {
    const { value } = studCatch(input({ studs: at([102, 508, 914, 1_321, 1_750]) }));
    expect(value?.spacingMm).toBe(406.4);
    expect(value?.studs.filter(({ xMm }) => xMm > 1_600 && xMm < 1_900)).toHaveLength(1);
  });

  it('finds the spacing of most made-up walls and never a wrong one', () => {
    let found = 0;
    for (let seed = 0; seed < 200; seed++) {
      const random = seeded(seed);
      const spacings = [400, 406.4, 600, 609.6];
      const spacing = spacings[seed % 4] ?? 400;
      const phase = random.between(0, spacing);
      const studs = Array.from({ length: 6 }, (_, k) => ({
        id: `${k}`,
        centreMm: phase + k * spacing + random.normal() * 2,
        u: 2,
      }));
      const grid = studGrid(studs, spacings);
      if (!grid) continue;
      expect(grid.spacingMm).toBe(spacing);
      found++;
    }
    expect(found).toBeGreaterThan(120);
  });

  it('gives the mirrored studs for the mirrored wall', () => {
    const xs = [102, 508, 914, 1_321];
    const one = studCatch(input({})).value;
    const other = studCatch(input({ studs: at(xs.map((x) => 3_000 - x)) })).value;
    const mirrored = other?.studs.map(({ xMm }) => 3_000 - xMm).sort((a, b) => a - b) ?? [];
    one?.studs.forEach(({ xMm }, i) => {
      expect(mirrored[i]).toBeCloseTo(xMm, 6);
    });
  });

  it('refuses a stud that stands nowhere', () => {
    const { value, problems } = studCatch(input({ studs: at([Number.NaN]) }));
    expect(value).toBeNull();
    expect(problems[0]).toMatchObject({ code: 'reading-impossible', about: ['stud 0'] });
  });
});
