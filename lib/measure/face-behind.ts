import { type FacePlace, faceColumns, faceRows, placeBetween } from './face';

/** Part of a wall behind cabinets. */
export type Band = { x0Mm: number; x1Mm: number; z0Mm: number; z1Mm: number };

/** A reading this near to the edge of a band lies in it. */
const ON_THE_EDGE_MM = 1e-6;

/** The face behind some cabinets, and the rows that cross each band. */
export type FaceBehind = {
  places: FacePlace[];
  rows: { band: Band; row: FacePlace[] }[];
  extrapolated: boolean;
};

/**
 * The face behind some cabinets: every reading in the bands, and the face where a row or column crosses
 * a band's edge, because it is straight between a reading outside and one inside.
 * Edge rule: a band beyond all readings takes the nearest row or column as it is, and says so.
 * Example: readings at x 0 and 1000 and a band from 500: the place at 500 is halfway between them.
 * Source: common practice (a profile is straight between readings).
 */
export function faceBehind(places: FacePlace[], bands: Band[]): FaceBehind {
  const found = bands.map((band) => behindBand(places, band));
  const kept = new Map<string, FacePlace>();
  for (const place of found.flatMap((behind) => behind.places)) {
    kept.set(place.id ?? `${place.xMm}/${place.zMm}`, place);
  }
  return {
    places: [...kept.values()],
    rows: found.flatMap(({ rows }) => rows),
    extrapolated: found.some(({ extrapolated }) => extrapolated),
  };
}

function behindBand(places: FacePlace[], band: Band): FaceBehind {
  const read = rowsBehind(places, band);
  const rows = read.map((row) => ({ band, row }));
  const inHeight = read.flat();
  const crossing = read.flatMap((row) =>
    [band.x0Mm, band.x1Mm].flatMap((xMm) => placeBetween(row, 'xMm', xMm) ?? []),
  );
  const behind = [...inHeight, ...crossing].filter(({ xMm }) => within(xMm, band.x0Mm, band.x1Mm));
  const heightsRead = inHeight.some(({ zMm }) => within(zMm, band.z0Mm, band.z1Mm));
  if (behind.length > 0) return { places: behind, rows, extrapolated: !heightsRead };
  const beside = nearestLine(faceColumns(inHeight), 'xMm', band.x0Mm, band.x1Mm);
  return { places: beside.flat(), rows, extrapolated: true };
}

/** The rows that cross a band, up to and with its upper and lower edge, in order along the wall. */
function rowsBehind(places: FacePlace[], band: Band): FacePlace[][] {
  const rows = faceRows(places);
  const read = rows.filter((row) => row.some(({ zMm }) => within(zMm, band.z0Mm, band.z1Mm)));
  const inside = [...read, ...faceRows(crossings(places, band))];
  return inside.length > 0 ? inside : nearestLine(rows, 'zMm', band.z0Mm, band.z1Mm);
}

/** Where columns cross the band's lower and upper edge. */
function crossings(places: FacePlace[], band: Band): FacePlace[] {
  return faceColumns(places).flatMap((column) =>
    [band.z0Mm, band.z1Mm].flatMap((zMm) => {
      const place = placeBetween(column, 'zMm', zMm);
      return place === null || place.id !== null ? [] : [place];
    }),
  );
}

function nearestLine(
  found: FacePlace[][],
  along: 'xMm' | 'zMm',
  from: number,
  to: number,
): FacePlace[][] {
  const distance = (line: FacePlace[]) => {
    const at = line[0]?.[along] ?? 0;
    return Math.max(from - at, at - to, 0);
  };
  const nearest = Math.min(...found.map(distance));
  return found.filter((line) => distance(line) <= nearest + ON_THE_EDGE_MM);
}

function within(value: number, from: number, to: number): boolean {
  return value >= from - ON_THE_EDGE_MM && value <= to + ON_THE_EDGE_MM;
}
