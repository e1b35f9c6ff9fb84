import { describe, expect, it } from 'vitest';
import { planeOf } from '@/lib/measure/minimum-zone-plane';
import { straightness } from '@/lib/measure/straightness';
import { rowFrom } from '../lib/measure/row-from';
import data from './data/surface-plate.json';

const names = Object.keys(
  data.inputs.readingsArcsec,
) as (keyof typeof data.inputs.readingsArcsec)[];
type Name = (typeof names)[number];
const published = data.published.heights as Record<Name, number[]>;
const arcsecond = Math.PI / 648_000;

/** Heights along one line from its angles, 1e-5 in, from its start. */
function climbed(name: Name): number[] {
  const heights = [0];
  for (const angle of data.inputs.readingsArcsec[name]) {
    heights.push((heights.at(-1) ?? 0) + angle * arcsecond * data.inputs.footSpacingIn * 1e5);
  }
  return heights;
}

/** Turned and lifted so that its ends stand at two heights. */
function tied(heights: number[], start: number, end: number): number[] {
  const [from = 0, to = 0] = [heights[0], heights.at(-1)];
  const last = heights.length - 1;
  return heights.map(
    (height, at) => height - from + start + ((end - start - (to - from)) * at) / last,
  );
}

/** All lines of the plate over the plane of its two diagonals, least height 0. */
function reduced(): { heights: Record<Name, number[]>; closure: { E_W: number; N_S: number } } {
  const diagonal = (name: Name) => {
    const level = tied(climbed(name), 0, 0);
    const middle = level[(level.length - 1) / 2] ?? 0;
    return level.map((height) => height - middle);
  };
  const [down, up] = [diagonal('NW_SE'), diagonal('NE_SW')];
  const [nwSe, neSw] = [down[0] ?? 0, up[0] ?? 0];
  const side = (name: Name, start: number, end: number) => tied(climbed(name), start, end);
  const sides = {
    NE_NW: side('NE_NW', neSw, nwSe),
    NE_SE: side('NE_SE', neSw, nwSe),
    SE_SW: side('SE_SW', nwSe, neSw),
    NW_SW: side('NW_SW', nwSe, neSw),
  };
  const middleOf = (line: number[]) => line[(line.length - 1) / 2] ?? 0;
  const all: Record<Name, number[]> = {
    NW_SE: down,
    NE_SW: up,
    ...sides,
    E_W: side('E_W', middleOf(sides.NE_SE), middleOf(sides.NW_SW)),
    N_S: side('N_S', middleOf(sides.NE_NW), middleOf(sides.SE_SW)),
  };
  const closure = { E_W: middleOf(all.E_W), N_S: middleOf(all.N_S) };
  // The middle lines meet the diagonals at the centre, as published: what they miss it by is the closure.
  for (const name of ['E_W', 'N_S'] as const) {
    all[name] = all[name].map((height) => height - closure[name]);
  }
  const least = Math.min(...Object.values(all).flat());
  const heights = Object.fromEntries(
    names.map((name) => [name, all[name].map((height) => height - least)]),
  ) as Record<Name, number[]>;
  return { heights, closure };
}

const { heights, closure } = reduced();
const points = names.flatMap((name) =>
  (data.published.plotXy as Record<Name, number[][]>)[name].map(([x = 0, y = 0], at) => ({
    id: `${name}${at}`,
    xMm: x * 4,
    yMm: y * 4,
    sMm: heights[name][at] ?? Number.NaN,
    u: 0.1,
  })),
);

describe('flatness of a surface plate as published', () => {
  it('finds the published heights from the published angles', () => {
    for (const name of names) {
      for (const [at, height] of published[name].entries()) {
        expect(heights[name][at]).toBeCloseTo(height, 2);
      }
    }
    // 1e-5 in here, micro-inches there.
    expect(closure.E_W * 10).toBeCloseTo(data.published.centreClosureUin.E_W, 1);
    expect(closure.N_S * 10).toBeCloseTo(data.published.centreClosureUin.N_S, 1);
    const all = names.flatMap((name) => heights[name]);
    expect(Math.max(...all) - Math.min(...all)).toBeCloseTo(data.published.flatness, 1);
  });

  it('finds a minimum zone within the published flatness, and the same by a search of slopes', () => {
    const { value } = planeOf(points);
    const zone = value?.minimumZone.value ?? Number.NaN;
    expect(zone).toBeLessThanOrEqual(data.published.flatness + 0.05);
    expect(zone).toBeLessThanOrEqual(value?.leastSquares.value ?? 0);
    expect(zone).toBeCloseTo(bySearch(), 5);
  });

  it('finds every line of the plate no straighter by least squares than by its minimum zone', () => {
    for (const name of names) {
      const { value } = straightness(
        rowFrom(
          published[name].map((_, at) => at * 4),
          published[name],
        ),
      );
      expect(value?.minimumZone.value).toBeLessThanOrEqual(value?.leastSquares.value ?? 0);
      expect(value?.minimumZone.value).toBeLessThanOrEqual(data.published.flatness);
    }
  });
});

/** The width over slopes is convex: a search within a search, slow and obvious. */
function bySearch(): number {
  const widthAt = (a: number, b: number) => {
    const levels = points.map(({ xMm, yMm, sMm }) => sMm - a * xMm - b * yMm);
    return Math.max(...levels) - Math.min(...levels);
  };
  const least = (of: (slope: number) => number) => {
    let [low, high] = [-0.5, 0.5];
    for (let step = 0; step < 60; step += 1) {
      const [a, b] = [low + (high - low) / 3, high - (high - low) / 3];
      if (of(a) < of(b)) high = b;
      else low = a;
    }
    return of((low + high) / 2);
  };
  return least((a) => least((b) => widthAt(a, b)));
}
