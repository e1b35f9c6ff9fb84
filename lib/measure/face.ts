import { bracket } from './bracket';
import { type Combination, combine, type ErrorSource, readCombination } from './combination';

/**
 * A place on a wall's face: x, z on the wall and how far it stands proud of the reference, positive
 * into the room (s = −gap). Offsets are comparable only inside one set-up.
 */
export type FacePoint = {
  id: string;
  xMm: number;
  zMm: number;
  sMm: number;
  u: number;
  setUpId: string;
};

/** A place with what its offset was made of: a reading, or a value between two. */
export type FacePlace = {
  xMm: number;
  zMm: number;
  c: Combination;
  /** The reading that lies exactly here. */
  id: string | null;
};

/** Readings this near in height are one row, this near along the wall one column; from memory. */
const SAME_LINE_MM = 60;

/** The reading as a place; the set-up's own plumb error grows with z and is shared by all its readings. */
export function facePlace({ id, xMm, zMm, sMm, u }: FacePoint, plumb: ErrorSource): FacePlace {
  const c = readCombination(id, sMm, u);
  if (plumb.u > 0) c.parts.push({ source: plumb, weight: zMm });
  return { xMm, zMm, c, id };
}

/** Rows from the floor up, each in order along the wall; a row's height is that of its first reading. */
export function faceRows(places: FacePlace[]): FacePlace[][] {
  return lines(places, 'zMm', 'xMm');
}

/** Columns from left to right, each from the floor up. */
export function faceColumns(places: FacePlace[]): FacePlace[][] {
  return lines(places, 'xMm', 'zMm');
}

/**
 * The face at a place of a row or column, straight between readings.
 * Edge rule: null past the line's ends.
 */
export function placeBetween(
  line: FacePlace[],
  along: 'xMm' | 'zMm',
  atMm: number,
): FacePlace | null {
  const found = bracket(line, (place) => place[along], atMm);
  if (found === null) return null;
  return found.share === 0 ? found.from : mixed(found.from, found.to, found.share);
}

function mixed(from: FacePlace, to: FacePlace, share: number): FacePlace {
  const c = combine([
    [1 - share, from.c],
    [share, to.c],
  ]);
  const between = (a: number, b: number) => a + share * (b - a);
  return { xMm: between(from.xMm, to.xMm), zMm: between(from.zMm, to.zMm), c, id: null };
}

function lines(places: FacePlace[], across: 'xMm' | 'zMm', along: 'xMm' | 'zMm'): FacePlace[][] {
  const sorted = [...places].sort((a, b) => a[across] - b[across]);
  const found: FacePlace[][] = [];
  for (const place of sorted) {
    const line = found.at(-1);
    const first = line?.[0];
    if (line && first && place[across] - first[across] <= SAME_LINE_MM) line.push(place);
    else found.push([place]);
  }
  return found.map((line) => line.sort((a, b) => a[along] - b[along]));
}
