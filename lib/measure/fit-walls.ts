/** The walls of a fit: lengths, straightness, plumb, flatness. */
import type { WallColumn, WallFit, WallRow } from '@/lib/measure/fit';
import { type FitContext, SURE_LENGTH_U_MM } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { flatZone } from '@/lib/measure/minimum-zone-plane';
import type { WalkedWall } from '@/lib/measure/room-walk';
import { straightedgeGap } from '@/lib/measure/straightedge-gap';
import { straightZone } from '@/lib/measure/straightness';
import type { FaceRow, WallFaces } from '@/lib/measure/wall-faces';
import type { PlumbColumn } from '@/lib/measure/wall-lean';
import type { Problem } from '@/lib/problem';

/** A plane is laid through three readings; a fourth shows whether it is flat. */
const FEWEST_FOR_FLATNESS = 4;

/**
 * Lengths, rows, columns and flatness of every wall.
 * Edge: a length is null until it is surer than 20 mm; a row needs three readings, a flatness four.
 */
export function fitWalls(
  context: FitContext,
  straightedgeMm: number,
): { walls: WallFit[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const walls = context.walk.walls.map((walked) =>
    fitWall(context, walked, straightedgeMm, problems),
  );
  return { walls, problems };
}

function fitWall(
  context: FitContext,
  { wall }: WalkedWall,
  straightedgeMm: number,
  problems: Problem[],
): WallFit {
  const faces = context.faces.get(wall.id);
  const frame = context.frames.get(wall.id);
  const isSure = frame !== undefined && frame.length.u <= SURE_LENGTH_U_MM;
  const rows = faces?.setUps.flatMap((setUp) => setUp.rows) ?? [];
  return {
    wallId: wall.id,
    name: wall.name,
    readAt: context.lengths
      .filter(({ wallId }) => wallId === wall.id)
      .map(({ zMm, yMm, length, isInPieces }) => ({
        zMm,
        yMm,
        length: fitFigure(isInPieces ? 'wall-length-in-pieces' : 'wall-length-read', length),
      })),
    length: isSure ? fitFigure('wall-length', frame.length) : null,
    zRefMm: frame?.zRefMm ?? 0,
    rows: rows.flatMap((row) => fitRow(row, straightedgeMm, problems) ?? []),
    columns: (context.columns.get(wall.id) ?? []).map(fitColumn),
    flatness: faces ? flatness(faces, problems) : null,
    verdicts: [],
  };
}

function fitRow(row: FaceRow, straightedgeMm: number, problems: Problem[]): WallRow | null {
  if (row.points.length < 3) return null;
  const straight = straightZone(row.points);
  problems.push(...straight.problems);
  if (!straight.value) return null;
  const under = straightedgeGap(row.points, straightedgeMm).value;
  return {
    zMm: row.zMm,
    setUpId: row.setUpId,
    outOfStraight: fitFigure('wall-straightness', straight.value.minimumZone),
    shape: straight.value.shape,
    straightedge: under && {
      lengthMm: under.toMm - under.fromMm,
      atMm: under.fromMm,
      gap: fitFigure('wall-straightedge-gap', under.gap),
    },
    points: row.points.map(({ id, atMm, sMm }) => ({ xMm: atMm, sMm, readingId: id })),
  };
}

function fitColumn({ column, plumb }: PlumbColumn): WallColumn {
  return {
    xMm: column.xMm,
    setUpId: column.setUpId,
    lean: fitFigure('wall-lean', plumb.perMetre),
    over: fitFigure('wall-plumb', plumb.over),
    heightMm: plumb.overMm,
    leans: plumb.leans,
    points: column.points.map(({ id, atMm, sMm }) => ({ zMm: atMm, sMm, readingId: id })),
  };
}

/** The fullest set-up decides; readings of several cannot be laid together. */
function flatness(faces: WallFaces, problems: Problem[]) {
  const fullest = faces.setUps
    .filter(({ plumb, along }) => plumb && along)
    .reduce<WallFaces['setUps'][number] | null>(
      (best, one) => (best && best.points.length >= one.points.length ? best : one),
      null,
    );
  if (!fullest || fullest.points.length < FEWEST_FOR_FLATNESS) return null;
  const plane = flatZone(
    fullest.points.map(({ id, xMm, zMm, sMm, u }) => ({ id, xMm, yMm: zMm, sMm, u })),
  );
  problems.push(...plane.problems);
  return plane.value && fitFigure('wall-flatness', plane.value.minimumZone);
}
