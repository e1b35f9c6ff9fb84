import { combine } from './combination';
import type { FacePlace } from './face';
import { lowerHull, upperHull } from './hull';
import {
  type LeastTurn,
  leastTurn,
  type TurnEnd,
  type TurnLine,
  turnNearest,
  turnWithin,
} from './least-turn';

/** A plane whose turn is sought, and the face behind it. */
export type SeenPlane = {
  plane: { finishedEndMm: number | null };
  behind: { places: FacePlace[] };
};

/**
 * The turn that planes share when nothing fixes it: least gap at finished ends that show, then the
 * smallest largest gap over all, then nearest to the least-squares line.
 * Edge rule: null where every plane was read at one place along its wall only.
 */
export function turnOfPlanes(planes: SeenPlane[]): TurnEnd | null {
  const preferred = sharedLeastSquares(planes);
  if (preferred === null) return null;
  const everywhere = leastTurn(planes.flatMap(({ behind }) => gapLines(behind.places)));
  const atEnds = planes.flatMap(({ plane, behind }) =>
    plane.finishedEndMm === null ? [] : endLines(behind.places, plane.finishedEndMm),
  );
  const range: LeastTurn =
    atEnds.length > 0 ? turnWithin(leastTurn(atEnds), everywhere) : everywhere;
  return turnNearest(preferred, range);
}

/** Gap between the plane over a proud place and a place it stands off: one line for each such pair. */
function gapLines(places: FacePlace[]): TurnLine[] {
  const points = places.map((place) => ({ at: place.xMm, s: place.c.value, place }));
  const far = lowerHull(points);
  return upperHull(points).flatMap((proud) =>
    far.map((hollow) => ({
      proud: proud.place.c,
      hollow: hollow.place.c,
      d: proud.at - hollow.at,
    })),
  );
}

/** The gap at the finished end, held off by each proud place. The end's column is the one read nearest it. */
function endLines(places: FacePlace[], endMm: number): TurnLine[] {
  const distance = ({ xMm }: FacePlace) => Math.abs(xMm - endMm);
  const nearest = Math.min(...places.map(distance));
  const column = places.filter((place) => distance(place) <= nearest + 1e-6);
  const points = places.map((place) => ({ at: place.xMm, s: place.c.value, place }));
  return upperHull(points).flatMap((proud) =>
    column.map((end) => ({
      proud: proud.place.c,
      hollow: end.c,
      d: proud.at - end.xMm,
    })),
  );
}

function sharedLeastSquares(planes: SeenPlane[]): TurnEnd | null {
  const centred = planes.flatMap(({ behind: { places } }) => {
    const middle = places.reduce((sum, { xMm }) => sum + xMm, 0) / places.length;
    return places.map((place) => ({ c: place.c, arm: place.xMm - middle }));
  });
  const spread = centred.reduce((sum, { arm }) => sum + arm * arm, 0);
  if (!(spread > 1e-6)) return null;
  const c = combine(centred.map(({ c: read, arm }) => [arm / spread, read]));
  return { t: c.value, c };
}
