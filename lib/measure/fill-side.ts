/** One end of a run as filling sees it: the two limits, and the place that governs. */
import { type EndView, type FacePlace, viewEnd } from '@/lib/measure/end-view';
import { furthestIn, inward, placesOf } from '@/lib/measure/governing-places';
import { type WeighedPlace, weigh } from '@/lib/measure/place-uncertainty';
import type { RunFrame } from '@/lib/measure/run-frame';

export type FillEnd = {
  /** Face width of the filler, in its own plane. */
  leastMm: number;
  mostMm: number;
  /** A finished end: no filler, free room up to the plane given. */
  isOpen: boolean;
  /** Gables clear this end by so much over the carcass depth. */
  gableClearanceMm: number;
};

export type FillSide = {
  end: 'left' | 'right';
  view: EndView;
  inPlane: FacePlace[];
  /** Furthest in, in the filler's plane. */
  plane: FacePlace;
  /** Each place with what must be kept clear of it: gable clearance or least filler. */
  candidates: WeighedPlace[];
  governing: WeighedPlace;
  /** Least face width once the gable clears the end too. */
  leastFaceMm: number;
};

type SideInput = {
  frame: RunFrame;
  carcassDepthMm: number;
  fillerPlaneMm: number;
  z0Mm: number;
  z1Mm: number;
  left: FillEnd;
  right: FillEnd;
};

/**
 * The two limits at one end: the gable over the carcass, the filler in its plane, and which of them governs.
 * Edge: of equals within 1e-6 mm the first place governs; an open end keeps nothing clear.
 * Example: a belly of 40 behind the face and a gable clearance of 3 ask for 43 where the filler asks 25.
 */
export function lookAtEnd(
  input: SideInput,
  end: 'left' | 'right',
  covariance: number[][],
): FillSide {
  const view = viewEnd(input.frame, end);
  const z = [input.z0Mm, input.z1Mm] as const;
  const rule = input[end];
  const carcass = placesOf(view, [0, input.carcassDepthMm], z);
  const inPlane = placesInPlane(view, input.fillerPlaneMm, z);
  const candidates = weigh(covariance, [
    ...inPlane.map((place) => ({ place, clearMm: rule.isOpen ? 0 : rule.leastMm })),
    ...carcass.map((place) => ({ place, clearMm: rule.isOpen ? 0 : rule.gableClearanceMm })),
  ]);
  const plane = furthestIn(inPlane) ?? view.at(input.fillerPlaneMm, input.z0Mm);
  let governing: WeighedPlace = { place: plane, clearMm: 0, variance: 0, covarianceSlope: [] };
  candidates.forEach((candidate, i) => {
    const further =
      inward(candidate.place) + candidate.clearMm - inward(governing.place) - governing.clearMm;
    if (i === 0 || further > 1e-6) governing = candidate;
  });
  const leastFaceMm = inward(governing.place) + governing.clearMm - inward(plane);
  return { end, view, inPlane, plane, candidates, governing, leastFaceMm };
}

/** Another run's front is straight: its greater edge counts over the whole depth (MEASURE 7). */
function placesInPlane(view: EndView, planeMm: number, z: readonly [number, number]): FacePlace[] {
  if (view.meets === 'wall') return placesOf(view, [planeMm, planeMm], z);
  const edges = placesOf(view, [0, planeMm], z);
  const furthest = furthestIn(edges);
  return edges.filter((place) => place.yMm === furthest?.yMm);
}
