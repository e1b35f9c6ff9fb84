import { type Combination, combinationFigure, combine } from './combination';
import { type FacePlace, placeBetween } from './face';
import type { Band, FaceBehind } from './face-behind';
import type { Figure } from './figure';

export type GapAt = { xMm: number; zMm: number; gap: Figure };
export type EdgeGap = {
  xMm: number;
  least: GapAt;
  greatest: GapAt;
  /** Outside the readings: the nearest reading of a row was carried on. */
  extrapolated: boolean;
};
export type SetLine = {
  id: string;
  /** s of the plane at the run's two ends. */
  atLeft: { xMm: number; s: Figure };
  atRight: { xMm: number; s: Figure };
  largestGap: GapAt;
  /** At every reading in the bands; negative: the wall stands proud of a fixed plane. */
  gaps: (GapAt & { id: string })[];
  /** Behind every unit edge, and the finished end if one shows. */
  edges: EdgeGap[];
  touches: { xMm: number; zMm: number; ids: string[] }[];
  /** It touches one place along the wall only: shim the ends. */
  rocks: boolean;
  /** Where the wall stands proud of a fixed plane, as positive amounts. */
  wallToCut: { ids: string[]; xMm: number; zMm: number; proud: Figure }[];
};

type Placed = {
  plane: { id: string; bands: Band[]; edgesMm: number[]; finishedEndMm: number | null };
  behind: FaceBehind;
  /** s of the plane at x = 0. */
  offset: Combination;
  turn: Combination;
};

/** Nearer than this the plane touches. */
const TOUCHES_MM = 1e-6;
/** Places along the wall nearer than this are one, for what rocks. */
const ONE_PLACE_MM = 1;

/** What a set line leaves behind every reading, unit edge and finished end. */
export function describeSetLine(placed: Placed): SetLine {
  const { plane, behind } = placed;
  const gaps = behind.places.map((place) => ({ place, c: gapOf(placed, place) }));
  const touching = gaps.filter(({ c }) => Math.abs(c.value) <= TOUCHES_MM);
  const proud = gaps.filter(({ c }) => c.value < -TOUCHES_MM);
  const largest = gaps.reduce(
    (best, gap) => (gap.c.value > best.c.value ? gap : best),
    gaps[0] ?? nowhere,
  );
  const touchedAt = touching.map(({ place }) => place.xMm);
  const ends = plane.bands.flatMap(({ x0Mm, x1Mm }) => [x0Mm, x1Mm]);
  const edgesMm = [
    ...plane.edgesMm,
    ...(plane.finishedEndMm === null ? [] : [plane.finishedEndMm]),
  ];
  return {
    id: plane.id,
    atLeft: planeAt(placed, Math.min(...ends)),
    atRight: planeAt(placed, Math.max(...ends)),
    largestGap: shown(largest.place, largest.c),
    gaps: gaps.flatMap(({ place, c }) =>
      place.id === null ? [] : [{ id: place.id, ...shown(place, c) }],
    ),
    edges: [...new Set(edgesMm)].sort((a, b) => a - b).flatMap((xMm) => edgeGap(placed, xMm) ?? []),
    touches: touching.map(({ place }) => ({
      xMm: place.xMm,
      zMm: place.zMm,
      ids: combinationFigure(place.c).from,
    })),
    rocks: touchedAt.length > 0 && Math.max(...touchedAt) - Math.min(...touchedAt) <= ONE_PLACE_MM,
    wallToCut: proud.map(({ place, c }) => ({
      ids: combinationFigure(place.c).from,
      xMm: place.xMm,
      zMm: place.zMm,
      proud: combinationFigure(combine([[-1, c]])),
    })),
  };
}

const nowhere = { place: { xMm: 0, zMm: 0 }, c: { value: 0, parts: [] } };

function gapOf({ offset, turn }: Placed, { xMm, c }: FacePlace): Combination {
  return combine([
    [1, offset],
    [xMm, turn],
    [-1, c],
  ]);
}

function planeAt({ offset, turn }: Placed, xMm: number): { xMm: number; s: Figure } {
  const s = combine([
    [1, offset],
    [xMm, turn],
  ]);
  return { xMm, s: combinationFigure(s) };
}

function shown({ xMm, zMm }: { xMm: number; zMm: number }, c: Combination): GapAt {
  return { xMm, zMm, gap: combinationFigure(c) };
}

/** Least and greatest gap along the height of an edge: at each row, as the face runs between readings. */
function edgeGap(placed: Placed, xMm: number): EdgeGap | null {
  const heights = placed.behind.rows.flatMap(({ band, row }) => {
    if (xMm < band.x0Mm - ONE_PLACE_MM || xMm > band.x1Mm + ONE_PLACE_MM) return [];
    const between = placeBetween(row, 'xMm', xMm);
    const place = between ?? nearestOf(row, xMm);
    if (place === null) return [];
    return [
      { carried: between === null, at: { ...place, xMm }, c: gapOf(placed, { ...place, xMm }) },
    ];
  });
  const read = heights.filter(({ carried }) => !carried);
  const used = read.length > 0 ? read : heights;
  const [first] = used;
  if (!first) return null;
  let [least, greatest] = [first, first];
  for (const height of used) {
    if (height.c.value < least.c.value) least = height;
    if (height.c.value > greatest.c.value) greatest = height;
  }
  return {
    xMm,
    least: shown(least.at, least.c),
    greatest: shown(greatest.at, greatest.c),
    extrapolated: read.length === 0,
  };
}

function nearestOf(row: FacePlace[], xMm: number): FacePlace | null {
  let nearest: FacePlace | null = null;
  for (const place of row) {
    if (nearest === null || Math.abs(place.xMm - xMm) < Math.abs(nearest.xMm - xMm))
      nearest = place;
  }
  return nearest;
}
