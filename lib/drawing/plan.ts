import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import type { Revised } from '@/lib/sheet/revision-marks';
import { exaggerationFor } from './exaggeration';
import { planCorners } from './plan-corners';
import { planMarks } from './plan-marks';
import { planRevisions } from './plan-revisions';
import { planRuns } from './plan-runs';
import { planSuspects } from './plan-suspects';
import { planWalls } from './plan-walls';
import { type PlanWall, roomPlan } from './room-plan';
import { boundsOf, type Drawing, type Point } from './shape';
import { type FaceProfile, faceProfile } from './wall-faces';

export type PlanSource = {
  wallBook: WallBook;
  runs: readonly Run[];
  fit: Fit;
  rules: FitRules;
  /** What to cloud: it differs from the revision before. */
  revised?: Revised | null;
};

/** What each part of the plan is drawn from. */
export type PlanSheet = PlanSource & {
  walls: readonly PlanWall[];
  faces: ReadonlyMap<string, FaceProfile>;
  exaggeration: number;
  /** From mm of the room to drawing units. */
  at: (mm: Point) => Point;
  pxPerMm: number;
};

const planWidthPx = 740;
/** Room on the drawing for a bow, and for a corner's turn. */
const bowRoomMm = 130;
const cornerRoomDeg = 24;

/**
 * The room seen from above: walls with their faces and corners out of true drawn larger, dimensions,
 * diagonals, what stands where, suspects circled.
 *
 * Edge: before anything is read, the room as it was drawn.
 */
export function drawPlan(
  source: PlanSource,
  /** As wide as this, or to a scale of its own. */
  look: { widthPx?: number } | { pxPerMm: number } = {},
): Drawing {
  const walls = roomPlan(source.wallBook.room, source.fit);
  const faces = new Map(
    source.fit.walls.map((wall) => [wall.wallId, faceProfile(wall, source.rules.counterTopMm)]),
  );
  const exaggeration = exaggerationFor([
    ...[...faces.values()].flatMap((face) =>
      face.map(({ proudMm }) => ({ size: proudMm, room: bowRoomMm })),
    ),
    ...source.fit.corners.map(({ deviation }) => ({
      size: deviation?.value ?? 0,
      room: cornerRoomDeg,
    })),
  ]);
  const points = walls.flatMap(({ from, to }) => [from, to]);
  const left = Math.min(...points.map(([x]) => x), Number.POSITIVE_INFINITY);
  const right = Math.max(...points.map(([x]) => x), Number.NEGATIVE_INFINITY);
  const top = Math.min(...points.map(([, y]) => y), Number.POSITIVE_INFINITY);
  const bottom = Math.max(...points.map(([, y]) => y), Number.NEGATIVE_INFINITY);
  const marginPx = 84;
  const spanMm = Math.max(right - left, (bottom - top) * 1.15, 1);
  const pxPerMm =
    'pxPerMm' in look ? look.pxPerMm : ((look.widthPx ?? planWidthPx) - 2 * marginPx) / spanMm;
  const sheet: PlanSheet = {
    ...source,
    walls,
    faces,
    exaggeration,
    pxPerMm,
    at: ([x, y]) => [(x - left) * pxPerMm, (y - top) * pxPerMm],
  };
  const shapes = [
    ...planRuns(sheet),
    ...planWalls(sheet),
    ...planMarks(sheet),
    ...planCorners(sheet),
    ...planSuspects(sheet),
    ...planRevisions(sheet),
  ];
  return { shapes, bounds: boundsOf(shapes, 12), exaggeration, pxPerMm };
}
