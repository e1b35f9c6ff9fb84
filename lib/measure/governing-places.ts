/** The places of an end face that can govern a run, and which of them does. */
import type { EndView, FacePlace } from '@/lib/measure/end-view';
import { readingsBehind } from '@/lib/measure/face-surface';

/** Every place that can govern: the corners of the part asked for and the readings' lines inside it. */
export function placesOf(
  view: EndView,
  yRangeMm: readonly [number, number],
  zRangeMm: readonly [number, number],
): FacePlace[] {
  const ys = nodes(view.surface?.yMm ?? [], yRangeMm);
  const zs = nodes(view.surface?.zMm ?? [], zRangeMm);
  return ys.flatMap((y) => zs.map((z) => view.at(y, z)));
}

/** The place furthest into the run; the first of equals within 1e-6 mm. */
export function furthestIn(places: FacePlace[]): FacePlace | null {
  let found: FacePlace | null = null;
  for (const place of places) {
    if (!found || inward(place) > inward(found) + 1e-6) found = place;
  }
  return found;
}

/** Larger: further into the run. */
export function inward(place: FacePlace): number {
  return place.end === 'left' ? place.xMm : -place.xMm;
}

/** Readings behind one place. */
export function placeFrom(view: EndView, place: FacePlace): string[] {
  return [...new Set([...view.baseFrom, ...readingsBehind(place)])];
}

function nodes(inside: number[], range: readonly [number, number]): number[] {
  const [from, to] = range;
  if (to <= from) return [from];
  return [from, ...inside.filter((value) => value > from + 1e-6 && value < to - 1e-6), to];
}
