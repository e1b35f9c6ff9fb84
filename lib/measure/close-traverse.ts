/** Walks a chain of walls round by its lengths and angles: does it come back to where it began? */
import { type Outcome, problem, refused } from '@/lib/problem';
import { type Figure, figure } from './figure';
import { isMeasured, isSize, type Measured } from './measured';
import type { ToolShare } from './room-observations';
import { ErrorSum, traverseErrors } from './traverse-errors';

/** u is the whole of it; the part that all readings of one tool share may be named. */
export type TraverseReading = Measured & { tool?: ToolShare | null };

export type TraverseLeg = {
  length: TraverseReading;
  /** Interior angle at the leg's left end, degrees; null at the start of an open chain. */
  leftAngle: TraverseReading | null;
};
export type TraverseInput = {
  closed: boolean;
  legs: TraverseLeg[];
  /** Heading of the first leg, degrees, clockwise as seen from above; 0 along x. */
  firstHeadingDeg?: number;
};

export type Traverse = {
  /** Sum of the angles less (n − 2)·180, degrees; null for an open chain. */
  angleMisclosure: Figure | null;
  /** In order of the legs, the misclosure shared out equally; as read for an open chain. */
  balancedAnglesDeg: (number | null)[];
  headingsDeg: number[];
  /** Each leg along x and y. */
  steps: { dxMm: number; dyMm: number }[];
  /** From the start to the end of the walk; for an open chain simply where it ends. */
  gap: { dxMm: number; dyMm: number };
  /** Length of the gap; null for an open chain. */
  linearMisclosure: Figure | null;
  perimeterMm: number;
  /** n of 1:n; null for an open chain, or where the walk closes to the last digit. */
  relativePrecision: number | null;
  /** Points of the walk as it runs, before the compass rule; the last is the end of the walk. */
  walk: { xMm: number; yMm: number }[];
  /** Corners after the compass rule; for an open chain the walk itself. */
  points: { xMm: number; yMm: number }[];
  /** By the coordinates of the points, positive for a chain that runs clockwise; null if open. */
  areaMm2: number | null;
};

/**
 * Balances the angles, walks the legs, and shares the linear misclosure by the compass rule.
 *
 * Frame: x east, y south, headings clockwise from x as seen from above: heading[i] = heading[i − 1] +
 * 180 − angle[i]. A surveyor's bearing from north is this heading with x north and y east.
 * u: each reading's own part, and the part that one tool shares n-fold; balancing takes a shared error of
 * the angles out of the walk again. Edge: the first leg's heading is given, so the angle at its left end only takes part in the balance.
 * An open chain is laid out as read: it does not close and says so by nulls.
 * Example: legs of 3000, 2000, 3000, 2003 with four angles of 90°: angles close, the walk ends 3 mm off
 * along y, 1:3334, area 6.0045 m².
 * Problems: `chain-too-short`, `angle-missing`, `reading-impossible`.
 * Source: compass rule (Bowditch) as worked in J. Mahun, Open Access Surveying Library, Traverse
 * Computations; area by coordinates, the same.
 */
export function closeTraverse(input: TraverseInput): Outcome<Traverse> {
  const refusal = refuse(input);
  if (refusal) return refused(refusal);
  const { legs, closed } = input;
  const angles = legs.map((leg) => leg.leftAngle);
  const misclosure = closed ? angleMisclosure(angles) : null;
  const share = misclosure ? misclosure.value / legs.length : 0;
  const balanced = angles.map((angle) => (angle ? angle.value - share : null));
  const headings = headingsFrom(input.firstHeadingDeg ?? 0, balanced);
  const steps = legs.map((leg, i) => stepOf(leg.length.value, headings[i] ?? 0));
  const walk = walkOf(steps);
  const end = walk[walk.length - 1] ?? { xMm: 0, yMm: 0 };
  const perimeterMm = legs.reduce((sum, leg) => sum + leg.length.value, 0);
  const linearMm = Math.hypot(end.xMm, end.yMm);
  const points = closed ? byCompassRule(walk, legs, perimeterMm) : walk;
  return {
    value: {
      angleMisclosure: misclosure,
      balancedAnglesDeg: balanced,
      headingsDeg: headings,
      steps,
      gap: { dxMm: end.xMm, dyMm: end.yMm },
      linearMisclosure: closed
        ? figure(linearMm, traverseErrors(legs, headings, steps, end), idsOf(legs))
        : null,
      perimeterMm,
      relativePrecision: closed && linearMm > 0 ? perimeterMm / linearMm : null,
      walk,
      points,
      areaMm2: closed ? areaOf(points) : null,
    },
    problems: [],
  };
}

function refuse({ closed, legs }: TraverseInput) {
  const all = idsOf(legs);
  if (legs.length < (closed ? 3 : 1)) {
    return problem('chain-too-short', 'A closed room needs at least three walls.', all);
  }
  for (const [i, leg] of legs.entries()) {
    if (!leg.leftAngle && (closed || i > 0)) {
      return problem('angle-missing', 'A corner of this chain has not been read.', leg.length.from);
    }
    const { length, leftAngle } = leg;
    const isLength = isMeasured(length) && isSize(length.value);
    if (!isLength) {
      return problem(
        'reading-impossible',
        'This length cannot be true. Take it again.',
        length.from,
      );
    }
    if (leftAngle && !(isMeasured(leftAngle) && leftAngle.value > 0 && leftAngle.value < 360)) {
      return problem(
        'reading-impossible',
        'This angle cannot be true. Take it again.',
        leftAngle.from,
      );
    }
  }
  return null;
}

/** One tool's own error adds n-fold in a sum of n angles (JCGM 100:2008, 5.2.2 note 1). */
function angleMisclosure(angles: (TraverseReading | null)[]): Figure {
  const errors = new ErrorSum();
  let sum = -(angles.length - 2) * 180;
  for (const angle of angles) {
    if (!angle) continue;
    sum += angle.value;
    errors.add(angle, 1, 0);
  }
  return figure(
    sum,
    errors.along(1, 0),
    angles.flatMap((angle) => angle?.from ?? []),
  );
}

function headingsFrom(first: number, angles: (number | null)[]): number[] {
  const headings: number[] = [];
  for (const [i, angle] of angles.entries()) {
    const before = headings[i - 1];
    headings.push(before === undefined ? first : (before + 180 - (angle ?? 180)) % 360);
  }
  return headings;
}

function stepOf(lengthMm: number, headingDeg: number) {
  const heading = (headingDeg * Math.PI) / 180;
  return { dxMm: lengthMm * Math.cos(heading), dyMm: lengthMm * Math.sin(heading) };
}

function walkOf(steps: { dxMm: number; dyMm: number }[]) {
  const walk = [{ xMm: 0, yMm: 0 }];
  for (const [i, step] of steps.entries()) {
    const { xMm, yMm } = walk[i] ?? { xMm: 0, yMm: 0 };
    walk.push({ xMm: xMm + step.dxMm, yMm: yMm + step.dyMm });
  }
  return walk;
}

/** Each point moves against the gap in the share of the way walked so far. */
function byCompassRule(walk: Traverse['walk'], legs: TraverseLeg[], perimeterMm: number) {
  const end = walk[walk.length - 1] ?? { xMm: 0, yMm: 0 };
  let walked = 0;
  return legs.map((leg, i) => {
    const { xMm, yMm } = walk[i] ?? { xMm: 0, yMm: 0 };
    const share = walked / perimeterMm;
    walked += leg.length.value;
    return { xMm: xMm - end.xMm * share, yMm: yMm - end.yMm * share };
  });
}

function areaOf(points: Traverse['points']): number {
  const doubled = points.reduce((sum, point, i) => {
    const next = points[(i + 1) % points.length] ?? point;
    return sum + point.xMm * next.yMm - next.xMm * point.yMm;
  }, 0);
  return doubled / 2;
}

const idsOf = (legs: TraverseLeg[]) =>
  legs.flatMap((leg) => [...leg.length.from, ...(leg.leftAngle?.from ?? [])]);
