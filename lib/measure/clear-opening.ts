/** The largest plumb, square block that goes between the two ends of a run. */
import { type EndView, type FacePlace, viewEnd } from '@/lib/measure/end-view';
import { type Figure, figure } from '@/lib/measure/figure';
import { furthestIn, placeFrom, placesOf } from '@/lib/measure/governing-places';
import { combinedU, leastSafe, weigh } from '@/lib/measure/place-uncertainty';
import { angleToSetLine, frameCovariance, type RunFrame } from '@/lib/measure/run-frame';
import type { Outcome, Problem } from '@/lib/problem';

export type ClearOpeningInput = {
  frame: RunFrame;
  /** Carcass + bumper + door. */
  depthMm: number;
  z0Mm: number;
  z1Mm: number;
};

export type ClearOpening = {
  opening: Figure;
  /** The place at each end that governs it. */
  left: FacePlace;
  right: FacePlace;
  /** Least over all places of (opening there − U there). */
  safeMm: number;
};

/** Flatter or sharper than this an end is no face to fill against; from memory. */
const SHARPEST_DEG = 10;

/**
 * Clear opening of a run: `min xR − max xL` over the depth to the door fronts and the run's band of
 * height, cabinets along the set line.
 *
 * Edge rule: an end at 180° or more is open and has no face: give it as a plane. Outside the face
 * readings the face is carried on along the angle and the lean, and the place is marked.
 * Units and signs: mm, deg, lean in mm/mm; frames of MEASURE 1. The safe opening takes U off at every
 * place, not only at the governing one. Example: length 2400 ± 0, left 89°, right 90°, flat, depth 600:
 * the left face stands 10.47 in at the front, so 2389.53, "left end, front edge".
 * Problems: `end-is-open`, `corner-too-sharp`, `not-a-number`, `no-opening`.
 * Source: common practice; the propagation of u is JCGM 100:2008, 5.2.2.
 */
export function clearOpening(input: ClearOpeningInput): Outcome<ClearOpening> {
  const problems = endProblems(input.frame);
  if (problems.length > 0) return { value: null, problems };
  const views = { left: viewEnd(input.frame, 'left'), right: viewEnd(input.frame, 'right') };
  const lefts = placesOf(views.left, [0, input.depthMm], [input.z0Mm, input.z1Mm]);
  const rights = placesOf(views.right, [0, input.depthMm], [input.z0Mm, input.z1Mm]);
  const left = furthestIn(lefts);
  const right = furthestIn(rights);
  if (!left || !right || !Number.isFinite(right.xMm - left.xMm)) {
    return { value: null, problems: [notANumber(input.frame)] };
  }
  const covariance = frameCovariance(input.frame);
  const u = combinedU(covariance, [
    { place: right, sign: 1 },
    { place: left, sign: -1 },
  ]);
  const openingMm = right.xMm - left.xMm;
  const from = openingFrom(input.frame, views, left, right);
  if (openingMm <= 0) return { value: null, problems: [noOpening(openingMm, from)] };
  const clear = (place: FacePlace) => ({ place, clearMm: 0 });
  const safeMm = leastSafe(
    weigh(covariance, lefts.map(clear)),
    weigh(covariance, rights.map(clear)),
  );
  return { value: { opening: figure(openingMm, u, from), left, right, safeMm }, problems: [] };
}

/** What forbids reckoning an opening between these ends. */
export function endProblems(frame: RunFrame): Problem[] {
  const numbers = [frame.length.value, frame.zRefMm, frame.standOffMm, frame.turnDeg];
  for (const end of ['left', 'right'] as const) {
    const face = frame[end];
    numbers.push(face.meets === 'plane' ? face.x.value : face.angle.value);
    if (face.meets === 'wall') {
      numbers.push(face.lean.value, face.bow.value);
      for (const point of face.points) numbers.push(point.yMm, point.zMm, point.proudMm, point.uMm);
    }
    if (face.meets === 'run') numbers.push(face.frontMm, face.otherTurnDeg);
  }
  if (!numbers.every(Number.isFinite)) return [notANumber(frame)];
  return (['left', 'right'] as const).flatMap((end) => angleProblem(frame, end));
}

function angleProblem(frame: RunFrame, end: 'left' | 'right'): Problem[] {
  const face = frame[end];
  const angleDeg = angleToSetLine(frame, end);
  if (angleDeg === null || face.meets === 'plane') return [];
  if (angleDeg >= 180 - SHARPEST_DEG) {
    return [
      {
        code: 'end-is-open',
        message: `The ${end} end turns away from the run: it is an open end. Give it a limit.`,
        about: face.angle.from,
        severity: 'error',
      },
    ];
  }
  if (angleDeg > SHARPEST_DEG) return [];
  return [
    {
      code: 'corner-too-sharp',
      message: `The corner at the ${end} end is too sharp for a run to stand in. Read it again.`,
      about: face.angle.from,
      severity: 'error',
    },
  ];
}

function notANumber(frame: RunFrame): Problem {
  return {
    code: 'not-a-number',
    message: 'A length or angle behind this run is not a number. Read it again.',
    about: frame.length.from,
    severity: 'error',
  };
}

function noOpening(openingMm: number, from: string[]): Problem {
  return {
    code: 'no-opening',
    message: `The two ends overlap by ${(-openingMm).toFixed(1)} mm. Check the length and the corners.`,
    about: from,
    severity: 'error',
  };
}

function openingFrom(
  frame: RunFrame,
  views: { left: EndView; right: EndView },
  left: FacePlace,
  right: FacePlace,
): string[] {
  const ids = [...placeFrom(views.left, left), ...placeFrom(views.right, right)];
  const usesLength = views.right.meets !== 'plane';
  return [...new Set(usesLength ? [...frame.length.from, ...ids] : ids)];
}

/** "left end, front edge, at the floor": where a place lies, in the trade's words. */
export function placeWords(
  place: FacePlace,
  band: { depthMm: number; z0Mm: number; z1Mm: number },
  length: (mm: number) => string,
): string {
  return `${place.end} end, ${depthWords(place.yMm, band.depthMm, length)}, ${heightWords(place.zMm, band, length)}`;
}

function depthWords(yMm: number, depthMm: number, length: (mm: number) => string): string {
  if (yMm <= 1e-6) return 'back edge';
  if (yMm >= depthMm - 1e-6) return 'front edge';
  return `${length(yMm)} out`;
}

/** A base run's band ends near the floor, where a measurer says "at the floor". */
const NEAR_FLOOR_MM = 160;

function heightWords(
  zMm: number,
  band: { z0Mm: number; z1Mm: number },
  length: (mm: number) => string,
): string {
  if (zMm <= band.z0Mm + 1e-6) return band.z0Mm <= NEAR_FLOOR_MM ? 'at the floor' : 'at the bottom';
  if (zMm >= band.z1Mm - 1e-6) return 'at the top';
  return `at ${length(zMm)}`;
}
