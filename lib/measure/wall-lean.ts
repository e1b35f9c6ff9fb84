/** The lean of a wall from its columns of face readings. */
import { type Figure, figure } from '@/lib/measure/figure';
import { type ColumnLean, leanOfColumn } from '@/lib/measure/plumb';
import type { FaceColumn, WallFaces } from '@/lib/measure/wall-faces';

export type PlumbColumn = { column: FaceColumn; plumb: ColumnLean };

/** A wall leans a little otherwise elsewhere than where it was read: 1 mm/m; from memory. */
const USUAL_TWIST = 0.001;

/** Each column with its lean over the height that was read. */
export function plumbColumns(faces: WallFaces): PlumbColumn[] {
  return faces.setUps.flatMap((setUp) =>
    setUp.columns.flatMap((column): PlumbColumn[] => {
      const first = column.points[0];
      const last = column.points[column.points.length - 1];
      const overMm = (last?.atMm ?? 0) - (first?.atMm ?? 0);
      const plumb = leanOfColumn({ points: column.points, uReference: setUp.uPlumb, overMm });
      return plumb.value ? [{ column, plumb: plumb.value }] : [];
    }),
  );
}

/**
 * One lean for the whole wall, mm per mm: the mean of its columns, each weighed alike.
 * Edge rule: columns that differ widen u by their spread, and one column alone by a usual twist; null
 * with no column. Example: 2 and 4 mm/m, u 0.3 mm/m each: 3 mm/m, u √(0.21² + 1.41²/2 …) = 1.02 mm/m.
 */
export function leanOfWall(columns: PlumbColumn[]): Figure | null {
  const leans = columns.map(({ plumb }) => plumb.lean);
  const n = leans.length;
  if (n === 0) return null;
  const mean = leans.reduce((sum, { value }) => sum + value, 0) / n;
  const uRead = Math.max(...leans.map(({ u }) => u)) / Math.sqrt(n);
  const spread =
    n === 1
      ? USUAL_TWIST
      : Math.sqrt(leans.reduce((sum, { value }) => sum + (value - mean) ** 2, 0) / (n - 1));
  const from = [...new Set(leans.flatMap((lean) => lean.from))];
  // Not divided by √n: the wall at its corners may stand as any column does.
  return figure(mean, Math.hypot(uRead, Math.min(spread, USUAL_TWIST * 6) / Math.SQRT2), from);
}
