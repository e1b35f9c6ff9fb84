/** Every face reading of a wall in one frame: proud of the plumb plane through its corners at zRef. */
import { chordAt, type FaceSetUp, type WallFaces } from '@/lib/measure/wall-faces';

export type PlacedFace = {
  id: string;
  xMm: number;
  zMm: number;
  sMm: number;
  u: number;
  /** ∂s/∂(lean of the wall): what the reading itself does not say. */
  leanShareMm: number;
  /** ∂s/∂(bow of the wall). */
  bowShare: number;
  setUpId: string;
};

/**
 * Places the face readings of all set-ups in the frame of their wall.
 *
 * Edge rule: a set-up that runs along the wall but not from corner to corner is turned to its own
 * least-squares line; a plumb level at one place is laid on the wall's line at zRef. What a reading leaves
 * open is given as its share of the wall's lean and bow. Units: mm; s positive into the room.
 */
export function placedFaces(faces: WallFaces, zRefMm: number): PlacedFace[] {
  return faces.setUps.flatMap((setUp) => {
    if (!setUp.along)
      return setUp.columns.flatMap((column) => placeColumn(faces, setUp, column, zRefMm));
    return placeAlong(faces, setUp, zRefMm);
  });
}

/** 1 at the middle of the wall, 0 at its ends. */
export function bowShape(xMm: number, lengthMm: number): number {
  const t = Math.min(1, Math.max(0, xMm / Math.max(lengthMm, 1)));
  return 4 * t * (1 - t);
}

function placeColumn(
  faces: WallFaces,
  setUp: FaceSetUp,
  column: FaceSetUp['columns'][number],
  zRefMm: number,
): PlacedFace[] {
  const { sMm: atRefMm, zMm: foundAtMm } = interpolated(column.points, zRefMm);
  return column.points.map(({ id, atMm, sMm, u }) => ({
    id,
    xMm: column.xMm,
    zMm: atMm,
    sMm: sMm - atRefMm,
    u: Math.hypot(u, setUp.uPlumb * (atMm - foundAtMm)),
    leanShareMm: foundAtMm - zRefMm,
    bowShare: bowShape(column.xMm, faces.lengthMm),
    setUpId: setUp.id,
  }));
}

/** s at the height, or at the end of the column nearest to it. */
function interpolated(points: { atMm: number; sMm: number }[], zMm: number) {
  const first = points[0] ?? { atMm: zMm, sMm: 0 };
  const last = points[points.length - 1] ?? first;
  if (zMm <= first.atMm) return { sMm: first.sMm, zMm: first.atMm };
  if (zMm >= last.atMm) return { sMm: last.sMm, zMm: last.atMm };
  const next = points.findIndex(({ atMm }) => atMm >= zMm);
  const low = points[next - 1] ?? first;
  const high = points[next] ?? last;
  const t = (zMm - low.atMm) / (high.atMm - low.atMm);
  return { sMm: low.sMm + (high.sMm - low.sMm) * t, zMm };
}

type Laid = {
  atMm: (xMm: number) => number;
  zMm: number;
  uLine: number;
  bowShare: (xMm: number) => number;
};

function placeAlong(faces: WallFaces, setUp: FaceSetUp, zRefMm: number): PlacedFace[] {
  // A straightedge's rows stand alone; a laser plane is one reference for all its rows.
  const laidBy = new Map<string, Laid>();
  const plane = setUp.plumb ? layPlane(faces, setUp, zRefMm) : null;
  for (const row of setUp.plumb ? [] : setUp.rows) {
    const laid = layRow(faces, row);
    for (const point of row.points) laidBy.set(point.id, laid);
  }
  return setUp.points.flatMap((point): PlacedFace[] => {
    const laid = plane ?? laidBy.get(point.id);
    if (!laid) return [];
    const upMm = point.zMm - laid.zMm;
    return [
      {
        id: point.id,
        xMm: point.xMm,
        zMm: point.zMm,
        sMm: point.sMm - laid.atMm(point.xMm),
        u: Math.hypot(point.u, laid.uLine, setUp.uPlumb * upMm),
        leanShareMm: setUp.plumb ? laid.zMm - zRefMm : point.zMm - zRefMm,
        bowShare: laid.bowShare(point.xMm),
        setUpId: setUp.id,
      },
    ];
  });
}

/** The row that lays the whole plane: the chord row if this set-up has it, else the fullest. */
function layPlane(faces: WallFaces, setUp: FaceSetUp, zRefMm: number): Laid | null {
  const chord = faces.chordRow;
  if (chord?.setUpId === setUp.id) return layRow(faces, chord);
  const rows = [...setUp.rows].sort(
    (a, b) =>
      b.points.length - a.points.length || Math.abs(a.zMm - zRefMm) - Math.abs(b.zMm - zRefMm),
  );
  const fullest = rows[0];
  if (fullest) return layRow(faces, fullest);
  const point = setUp.points[0];
  if (!point) return null;
  return layRow(faces, {
    setUpId: setUp.id,
    zMm: point.zMm,
    points: [{ id: point.id, atMm: point.xMm, sMm: point.sMm, u: point.u }],
  });
}

function layRow(faces: WallFaces, row: FaceSetUp['rows'][number]): Laid {
  const { chordRow, lengthMm } = faces;
  if (chordRow && chordRow.setUpId === row.setUpId && chordRow.zMm === row.zMm) {
    return {
      atMm: (xMm) => chordAt(chordRow, lengthMm, xMm),
      zMm: row.zMm,
      uLine: chordRow.uEnds / Math.SQRT2,
      bowShare: () => 0,
    };
  }
  const line = leastSquares(row.points.map(({ atMm, sMm }) => [atMm, sMm] as const));
  // A bowed wall carries its own bow into the line laid through a part of it.
  const bow = leastSquares(row.points.map(({ atMm }) => [atMm, bowShape(atMm, lengthMm)] as const));
  const [first] = row.points;
  return {
    atMm: line,
    zMm: row.zMm,
    uLine: (first?.u ?? 0) / Math.sqrt(Math.max(1, row.points.length)),
    bowShare: bow,
  };
}

function leastSquares(points: (readonly [number, number])[]): (at: number) => number {
  const n = points.length;
  const meanX = points.reduce((sum, [x]) => sum + x, 0) / n;
  const meanY = points.reduce((sum, [, y]) => sum + y, 0) / n;
  const xx = points.reduce((sum, [x]) => sum + (x - meanX) ** 2, 0);
  const xy = points.reduce((sum, [x, y]) => sum + (x - meanX) * (y - meanY), 0);
  const slope = xx > 0 ? xy / xx : 0;
  return (at) => meanY + slope * (at - meanX);
}
