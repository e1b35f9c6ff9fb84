/** Filling a run: room, slack, where each unit stands, and whether it goes. */
import { endProblems } from '@/lib/measure/clear-opening';
import type { FacePlace } from '@/lib/measure/end-view';
import { type Figure, figure } from '@/lib/measure/figure';
import { type FillEnd, type FillSide, lookAtEnd } from '@/lib/measure/fill-side';
import { placeFrom } from '@/lib/measure/governing-places';
import { combinedU, leastSafe, type PlaceTerm } from '@/lib/measure/place-uncertainty';
import { frameCovariance, type RunFrame } from '@/lib/measure/run-frame';
import {
  type EndLimit,
  type RunVerdict,
  type ShareLimits,
  type SlackShare,
  shareSlack,
  verdictOf,
  type WidthSums,
} from '@/lib/measure/share-slack';
import type { Outcome } from '@/lib/problem';

export type FillRunInput = {
  frame: RunFrame;
  carcassDepthMm: number;
  /** Distance out of the set line of the plane in which a filler's width counts. */
  fillerPlaneMm: number;
  z0Mm: number;
  z1Mm: number;
  left: FillEnd;
  right: FillEnd;
  units: { id: string; widthMm: number }[];
  /** What each joint between two units adds. */
  jointGrowthMm: number;
  /** A unit's built width is within ± this. */
  unitBuildToleranceMm: number;
  share: SlackShare;
};

export type FilledEnd = {
  /** Filler's face, least over the height; at an open end the room left up to the limit. */
  face: Figure;
  isOpen: boolean;
  /** Least face width once the gable clears the end too. */
  leastMm: number;
  mostMm: number;
  verdict: RunVerdict;
  /** Place in the filler plane that governs the face width. */
  place: FacePlace;
  /** Face width at every reading along the edge, top first. */
  widths: { zMm: number; width: Figure; readingId: string | null; extrapolated: boolean }[];
};

export type FilledRun = {
  room: Figure;
  unitsMm: number;
  jointGrowthMm: number;
  slack: Figure;
  verdict: RunVerdict;
  toLoseMm: number;
  shiftOfMarkMm: number | null;
  placed: { id: string; leftMm: number; rightMm: number }[];
  left: FilledEnd;
  right: FilledEnd;
  limits: ShareLimits;
};

/**
 * Fills a run: two limits at each end (gable over the carcass, filler in its plane), slack, sharing, verdict.
 *
 * Edge rule: a face width is the least over the height; `short` before `loose` before `tight` before
 * `fits`; within 1e-6 mm a limit is kept; a centred unit that is not in the run is shared equally.
 * Units: mm; x along the set line from the wall's left corner. Example: 2400 between true walls, units
 * 600 + 900 + 800 = 2300, least 25, no growth: room 2350, slack 50, shared equally both fillers are 50.
 * Problems: those of `clearOpening`. Source: common practice; u of sums JCGM 100:2008, 5.1.2.
 */
export function fillRun(input: FillRunInput): Outcome<FilledRun> {
  const problems = endProblems(input.frame);
  if (problems.length > 0) return { value: null, problems };
  const covariance = frameCovariance(input.frame);
  const sides = {
    left: lookAtEnd(input, 'left', covariance),
    right: lookAtEnd(input, 'right', covariance),
  };
  const limits = shareLimits(input, sides);
  const sums = widthSums(input);
  const shared = shareSlack(limits, sums);
  const verdict = verdictOf(limits, sums);
  const unitsMm = sums.leftMm + sums.rightMm;
  const growthMm = jointsMm(input, input.units.length);
  const { left, right } = sides;
  const roomMm = spanBetween(left, right);
  const terms: PlaceTerm[] = [
    { place: right.governing.place, sign: 1 },
    { place: left.governing.place, sign: -1 },
  ];
  const from = [
    ...new Set([
      ...(right.view.meets === 'plane' ? [] : input.frame.length.from),
      ...placeFrom(left.view, left.governing.place),
      ...placeFrom(right.view, right.governing.place),
    ]),
  ];
  const unitsU = unitsUncertainty(input, input.units.length);
  const x0Mm = left.plane.xMm + shared.leftFaceMm;
  const end = (at: 'left' | 'right'): FilledEnd => ({
    ...faceWidths(input, sides, covariance, at, shared.leftPart, shared[`${at}FaceMm`]),
    isOpen: input[at].isOpen,
    leastMm: limits[at].leastMm,
    mostMm: input[at].mostMm,
    verdict: verdict[at],
    place: sides[at].plane,
  });
  return {
    value: {
      room: figure(roomMm, combinedU(covariance, terms), from),
      unitsMm,
      jointGrowthMm: growthMm,
      slack: figure(roomMm - unitsMm - growthMm, combinedU(covariance, terms, unitsU), from),
      verdict: verdict.run,
      toLoseMm: verdict.toLoseMm,
      shiftOfMarkMm: verdict.shiftOfMarkMm,
      placed: placeUnits(input, x0Mm),
      left: end('left'),
      right: end('right'),
      limits,
    },
    problems: [],
  };
}

/** Where the units of a run would stand, and nothing more; none where the ends are impossible. */
export function layOut(input: FillRunInput): FilledRun['placed'] {
  if (endProblems(input.frame).length > 0) return [];
  const covariance = frameCovariance(input.frame);
  const sides = {
    left: lookAtEnd(input, 'left', covariance),
    right: lookAtEnd(input, 'right', covariance),
  };
  const shared = shareSlack(shareLimits(input, sides), widthSums(input));
  return placeUnits(input, sides.left.plane.xMm + shared.leftFaceMm);
}

type Sides = { left: FillSide; right: FillSide };

/** Room between the governing places, each clear of its end. */
function spanBetween(left: FillSide, right: FillSide): number {
  return (
    right.governing.place.xMm -
    right.governing.clearMm -
    left.governing.place.xMm -
    left.governing.clearMm
  );
}

function jointsMm(input: FillRunInput, unitCount: number): number {
  return Math.max(0, unitCount - 1) * input.jointGrowthMm;
}

/** Standard u of a part of the run: build tolerance and joint growth, each rectangular (JCGM 100, 4.3.7). */
function unitsUncertainty(input: FillRunInput, unitCount: number): number {
  const joints = Math.max(0, unitCount - 1);
  return Math.sqrt(
    (unitCount * input.unitBuildToleranceMm ** 2 + joints * input.jointGrowthMm ** 2) / 3,
  );
}

/** Widths on either side of the sharing point. */
export function widthSums(input: Pick<FillRunInput, 'units' | 'share'>): WidthSums {
  const index = centredIndex(input);
  let leftMm = 0;
  let rightMm = 0;
  input.units.forEach(({ widthMm }, i) => {
    const part = index === null || i < index ? 1 : i > index ? 0 : 0.5;
    leftMm += part * widthMm;
    rightMm += (1 - part) * widthMm;
  });
  return { leftMm, rightMm };
}

/** Which unit is centred; null where none is, or the one named is not in the run. */
export function centredIndex(input: Pick<FillRunInput, 'units' | 'share'>): number | null {
  const { share } = input;
  if (share.how !== 'centred') return null;
  const index = input.units.findIndex((unit) => unit.id === share.unitId);
  return index < 0 ? null : index;
}

function shareLimits(input: FillRunInput, sides: Sides): ShareLimits {
  const { left, right } = sides;
  const limit = (side: FillSide, rule: FillEnd): EndLimit => ({
    leastMm: side.leastFaceMm,
    mostMm: rule.isOpen ? Number.POSITIVE_INFINITY : Math.max(rule.mostMm, side.leastFaceMm),
    isOpen: rule.isOpen,
  });
  const ends = { left: limit(left, input.left), right: limit(right, input.right) };
  const count = input.units.length;
  const index = centredIndex(input);
  if (index === null || input.share.how !== 'centred') {
    const safeMm = leastSafe(left.candidates, right.candidates, unitsUncertainty(input, count));
    return {
      how: input.share.how === 'centred' ? 'equal' : input.share.how,
      ...ends,
      spanMm: right.plane.xMm - left.plane.xMm - jointsMm(input, count),
      safetyMm: spanBetween(left, right) - safeMm,
    };
  }
  const turn = (input.frame.turnDeg * Math.PI) / 180;
  const markMm = input.share.markMm * Math.cos(turn) - input.frame.standOffMm * Math.sin(turn);
  const leftCount = index + 1;
  const rightCount = count - index;
  return {
    how: 'centred',
    ...ends,
    leftSpanMm: markMm - left.plane.xMm - jointsMm(input, leftCount),
    rightSpanMm: right.plane.xMm - markMm - jointsMm(input, rightCount),
    leftSafetyMm: safetyToMark(left, unitsUncertainty(input, leftCount)),
    rightSafetyMm: safetyToMark(right, unitsUncertainty(input, rightCount)),
  };
}

/** What U takes off the room between an end and a mark. */
function safetyToMark(side: FillSide, unitsU: number): number {
  const inwardOf = ({ place, clearMm }: FillSide['governing']) =>
    (side.end === 'left' ? place.xMm : -place.xMm) + clearMm;
  const reach = side.candidates.map(
    (candidate) => inwardOf(candidate) + 2 * Math.sqrt(candidate.variance + unitsU ** 2),
  );
  return Math.max(...reach) - inwardOf(side.governing);
}

function placeUnits(input: FillRunInput, x0Mm: number): FilledRun['placed'] {
  let x = x0Mm;
  return input.units.map(({ id, widthMm }) => {
    const placed = { id, leftMm: x, rightMm: x + widthMm };
    x += widthMm + input.jointGrowthMm;
    return placed;
  });
}

/** The face at every height, and its least; what the end shares with the gable counts once. */
function faceWidths(
  input: FillRunInput,
  sides: Sides,
  covariance: number[][],
  at: 'left' | 'right',
  leftPart: number | null,
  leastFaceMm: number,
): Pick<FilledEnd, 'face' | 'widths'> {
  const here = sides[at];
  const other = sides[at === 'left' ? 'right' : 'left'];
  const into = at === 'left' ? 1 : -1;
  const ownPart = leftPart === null ? null : at === 'left' ? leftPart : 1 - leftPart;
  const index = centredIndex(input) ?? 0;
  const unitCount =
    ownPart !== null ? input.units.length : at === 'left' ? index + 1 : input.units.length - index;
  const unitsU = (ownPart ?? 1) * unitsUncertainty(input, unitCount);
  const from = (place: FacePlace, withOther: boolean) => [
    ...new Set([
      ...input.frame.length.from,
      ...placeFrom(here.view, place),
      ...(withOther ? placeFrom(other.view, other.plane) : []),
    ]),
  ];
  const width = (place: FacePlace): Figure => {
    const value = leastFaceMm + into * (here.plane.xMm - place.xMm);
    const terms: PlaceTerm[] = [{ place, sign: -into }];
    if (ownPart !== null) {
      terms.push({ place: here.plane, sign: into * (1 - ownPart) });
      terms.push({ place: other.plane, sign: into * ownPart });
    }
    return figure(
      value,
      combinedU(covariance, terms, unitsU),
      from(place, ownPart !== null && ownPart > 0),
    );
  };
  const widths = here.inPlane
    .map((place) => ({
      zMm: place.zMm,
      width: width(place),
      readingId: place.readingId,
      extrapolated: place.extrapolated,
    }))
    .sort((a, b) => b.zMm - a.zMm);
  return { face: width(here.plane), widths };
}
