/** The face readings of one wall: rows, columns, and the row that shows it from corner to corner. */
import type { ReadingOf } from '@/lib/contracts/readings';
import type { ProfilePoint } from '@/lib/measure/profile';
import { cluster, type RoomBook } from '@/lib/measure/room-book';
import { lengthUncertainty, slopeUncertainty } from '@/lib/measure/uncertainty';

export type FaceRow = { setUpId: string; zMm: number; points: ProfilePoint[] };
export type FaceColumn = { setUpId: string; xMm: number; points: ProfilePoint[] };

/** A row read from near one corner to near the other, carried on to both. */
export type ChordRow = FaceRow & { atLeftMm: number; atRightMm: number; uEnds: number };

export type FaceSetUp = {
  id: string;
  /** The reference is plumb: gaps at different heights can be compared. */
  plumb: boolean;
  /** The reference runs along the wall: gaps at different places can be compared. */
  along: boolean;
  /** Standard u of plumb, mm per mm. */
  uPlumb: number;
  points: { id: string; xMm: number; zMm: number; sMm: number; u: number }[];
  rows: FaceRow[];
  columns: FaceColumn[];
};

export type WallFaces = {
  wallId: string;
  lengthMm: number;
  setUps: FaceSetUp[];
  /** The longest row of a set-up that runs along the wall; null where none reaches both corners. */
  chordRow: ChordRow | null;
};

/** Readings this near in height are one row, this near along the wall one column; from memory. */
const SAME_LINE_MM = 60;
/** A row shows the wall corner to corner when it begins and ends within this part of its length … */
const REACHES_PART = 0.15;
/** … or within this of the corner; from memory. */
const REACHES_MM = 300;
/** A self-levelling laser where its sheet is not known: ±0.3 mm/m; from memory. */
export const LASER_PLANE_U = 0.0003 / Math.sqrt(3);

/**
 * Sorts the face readings of a wall into set-ups, rows and columns, and finds the row from corner to corner.
 * Edge: a plumb level at one place has no rows, a straightedge no columns; of rows that reach both corners
 * the fullest leads, then the one nearest to zRef.
 */
export function wallFaces(
  book: RoomBook,
  wallId: string,
  lengthMm: number,
  zRefMm: number,
): WallFaces {
  const readings = book.ofKind('face').filter((reading) => reading.wallId === wallId);
  const ids = [...new Set(readings.map(({ setUpId }) => setUpId))];
  const setUps = ids.map((id) =>
    faceSetUp(
      book,
      id,
      readings.filter(({ setUpId }) => setUpId === id),
    ),
  );
  const rows = setUps.filter(({ along }) => along).flatMap((setUp) => setUp.rows);
  const reaching = rows.flatMap((row) => chordOf(row, lengthMm) ?? []);
  reaching.sort(
    (a, b) =>
      b.points.length - a.points.length ||
      Math.abs(a.zMm - zRefMm) - Math.abs(b.zMm - zRefMm) ||
      a.zMm - b.zMm,
  );
  return { wallId, lengthMm, setUps, chordRow: reaching[0] ?? null };
}

function faceSetUp(book: RoomBook, id: string, readings: ReadingOf<'face'>[]): FaceSetUp {
  const kind = readings[0]?.setUpKind ?? 'straightedge';
  const tool = readings[0] ? book.toolOf(readings[0]) : null;
  const points = readings.map((reading) => ({
    id: reading.id,
    xMm: reading.xMm,
    zMm: reading.zMm,
    sMm: -reading.gapMm,
    u: gapUncertainty(book, reading),
  }));
  const rowPoint = ({ id, xMm, sMm, u }: (typeof points)[number]) => ({ id, atMm: xMm, sMm, u });
  const columnPoint = ({ id, zMm, sMm, u }: (typeof points)[number]) => ({ id, atMm: zMm, sMm, u });
  const plumb = kind !== 'straightedge';
  const along = kind !== 'plumb-level';
  const middle = (values: number[]) =>
    values.reduce((sum, value) => sum + value, 0) / values.length;
  const rows = cluster(points, ({ zMm }) => zMm, SAME_LINE_MM).map((row) => ({
    setUpId: id,
    zMm: middle(row.map(({ zMm }) => zMm)),
    points: row.map(rowPoint).sort((a, b) => a.atMm - b.atMm),
  }));
  const columns = cluster(points, ({ xMm }) => xMm, SAME_LINE_MM).map((column) => ({
    setUpId: id,
    xMm: middle(column.map(({ xMm }) => xMm)),
    points: column.map(columnPoint).sort((a, b) => a.atMm - b.atMm),
  }));
  return {
    id,
    plumb,
    along,
    uPlumb: tool?.spec.kind === 'level' ? slopeUncertainty(tool) : LASER_PLANE_U,
    points,
    rows: along ? rows.filter(({ points: { length } }) => length >= 2) : [],
    columns: plumb ? columns.filter(({ points: { length } }) => length >= 2) : [],
  };
}

/** A gap is read with a rule to the level, blade or laser line: the step and the repeat, no slope. */
function gapUncertainty(book: RoomBook, reading: ReadingOf<'face'>): number {
  const tool = book.toolOf(reading);
  const lengthMm = tool.spec.kind === 'level' ? 0 : reading.gapMm;
  return lengthUncertainty(tool, lengthMm, 1);
}

function chordOf(row: FaceRow, lengthMm: number): ChordRow | null {
  const first = row.points[0];
  const last = row.points[row.points.length - 1];
  const reachMm = Math.max(REACHES_MM, REACHES_PART * lengthMm);
  if (!first || !last || row.points.length < 3) return null;
  if (first.atMm > reachMm || last.atMm < lengthMm - reachMm) return null;
  const left = carriedTo(row.points, 0);
  const right = carriedTo([...row.points].reverse(), lengthMm);
  const uEnds = Math.max(left.u, right.u);
  return { ...row, atLeftMm: left.sMm, atRightMm: right.sMm, uEnds };
}

/** Carried on from the two outermost readings that lie at least 100 mm apart. */
function carriedTo(fromEnd: ProfilePoint[], atMm: number): { sMm: number; u: number } {
  const [end, ...rest] = fromEnd;
  const next = rest.find((point) => Math.abs(point.atMm - (end?.atMm ?? 0)) >= 100);
  if (!end || !next) return { sMm: end?.sMm ?? 0, u: end?.u ?? 0 };
  const t = (atMm - end.atMm) / (next.atMm - end.atMm);
  return {
    sMm: end.sMm + (next.sMm - end.sMm) * t,
    u: Math.hypot(end.u * (1 - t), next.u * t),
  };
}

/** How far the wall stands proud of the straight line corner to corner at x, from the chord row. */
export function proudAt(
  faces: WallFaces,
  xMm: number,
): { valueMm: number; uMm: number; id: string } | null {
  const row = faces.chordRow;
  const [first] = row?.points ?? [];
  if (!row || !first) return null;
  const at = Math.min(Math.max(xMm, 0), faces.lengthMm);
  const line = [
    { id: first.id, atMm: 0, sMm: row.atLeftMm, u: row.uEnds },
    ...row.points.filter(({ atMm }) => atMm > 0 && atMm < faces.lengthMm),
    { id: first.id, atMm: faces.lengthMm, sMm: row.atRightMm, u: row.uEnds },
  ];
  const next = Math.max(
    1,
    line.findIndex(({ atMm }) => atMm >= at),
  );
  const low = line[next - 1] ?? first;
  const high = line[next] ?? low;
  const t = high.atMm > low.atMm ? (at - low.atMm) / (high.atMm - low.atMm) : 0;
  const chord = chordAt(row, faces.lengthMm, at);
  const part = faces.lengthMm > 0 ? at / faces.lengthMm : 0;
  return {
    valueMm: low.sMm + (high.sMm - low.sMm) * t - chord,
    uMm: Math.hypot(low.u * (1 - t), high.u * t, row.uEnds * part, row.uEnds * (1 - part)),
    id: t < 0.5 ? low.id : high.id,
  };
}

/** The straight line from corner to corner in the row’s own set-up. */
export function chordAt(row: ChordRow, lengthMm: number, xMm: number): number {
  return row.atLeftMm + ((row.atRightMm - row.atLeftMm) * xMm) / Math.max(lengthMm, 1);
}
