/** One end of a run as seen from its set line: where its face stands at any place, and how sure. */
import {
  type FaceSurface,
  type FaceValue,
  faceSurface,
  readingsBehind,
} from '@/lib/measure/face-surface';
import {
  angleToSetLine,
  type OtherRunEnd,
  PARAMETER,
  PARAMETER_COUNT,
  type PlaneEnd,
  type RunFrame,
  type WallEnd,
} from '@/lib/measure/run-frame';

/** A place on an end face, as the run sees it. */
export type FacePlace = {
  end: 'left' | 'right';
  yMm: number;
  zMm: number;
  /** Along the set line from the foot of the wall's left corner. */
  xMm: number;
  /** ∂x over the frame's parameters. */
  slope: readonly number[];
  /** What the parameters do not hold: the face reading itself, a limit's own u. */
  ownU: number;
  /** Face readings behind it; see `readingsBehind`. */
  madeOf: FaceValue['madeOf'];
  readingId: string | null;
  extrapolated: boolean;
};

export type EndView = {
  end: 'left' | 'right';
  meets: 'wall' | 'run' | 'plane';
  /** Readings behind every place of this end. */
  baseFrom: string[];
  surface: FaceSurface | null;
  at: (yMm: number, zMm: number) => FacePlace;
};

const DEG = Math.PI / 180;
const NO_SLOPE: readonly number[] = new Array<number>(PARAMETER_COUNT).fill(0);

/** The opening and the fill of a run look at the same ends: a frame, once made, is never changed. */
const views = new WeakMap<RunFrame, Partial<Record<'left' | 'right', EndView>>>();

/** Look at one end of the run from its set line. */
export function viewEnd(frame: RunFrame, end: 'left' | 'right'): EndView {
  const seen = views.get(frame) ?? {};
  views.set(frame, seen);
  seen[end] ??= lookFrom(frame, end);
  return seen[end];
}

function lookFrom(frame: RunFrame, end: 'left' | 'right'): EndView {
  const face = frame[end];
  if (face.meets === 'plane') return viewPlane(frame, end, face);
  const baseFrom = unique([...(end === 'right' ? frame.length.from : []), ...face.angle.from]);
  return face.meets === 'run'
    ? viewOtherRun(frame, end, face, baseFrom)
    : viewWall(frame, end, face, baseFrom);
}

function viewPlane(frame: RunFrame, end: 'left' | 'right', face: PlaneEnd): EndView {
  const turn = frame.turnDeg * DEG;
  const xMm = face.x.value * Math.cos(turn) - frame.standOffMm * Math.sin(turn);
  return {
    end,
    meets: 'plane',
    baseFrom: face.x.from,
    surface: null,
    at: (yMm, zMm) => ({
      end,
      yMm,
      zMm,
      xMm,
      slope: NO_SLOPE,
      ownU: face.x.u,
      madeOf: [],
      readingId: null,
      extrapolated: false,
    }),
  };
}

function viewOtherRun(
  frame: RunFrame,
  end: 'left' | 'right',
  face: OtherRunEnd,
  baseFrom: string[],
): EndView {
  const lens = lensOf(frame, end);
  return {
    end,
    meets: 'run',
    baseFrom: unique([...baseFrom, ...face.from]),
    surface: null,
    at: (yMm, zMm) => ({
      end,
      yMm,
      zMm,
      xMm: lens.xOf(yMm, face.frontMm),
      slope: lens.slopeOf(yMm, face.frontMm, 0, 0),
      ownU: face.frontUMm / lens.sine,
      madeOf: [],
      readingId: null,
      extrapolated: false,
    }),
  };
}

function viewWall(
  frame: RunFrame,
  end: 'left' | 'right',
  face: WallEnd,
  baseFrom: string[],
): EndView {
  const lens = lensOf(frame, end);
  const shape = (yMm: number) => {
    const t = lens.yFromCorner(yMm) / lens.sine / Math.max(face.wallLengthMm, 1);
    const inside = Math.min(1, Math.max(0, t));
    return 4 * inside * (1 - inside);
  };
  const surface = faceSurface(face.points, {
    bowShape: shape,
    zRefMm: frame.zRefMm,
    usualBowMm: face.usualBowMm,
  });
  return {
    end,
    meets: 'wall',
    baseFrom: unique([...baseFrom, ...face.lean.from]),
    surface,
    at: (yMm, zMm) => {
      const here = surface.at(yMm, zMm);
      const leaning = face.lean.value * here.leanShareMm;
      const proud = here.proudMm + leaning + face.bow.value * here.bowShare;
      return {
        end,
        yMm,
        zMm,
        xMm: lens.xOf(yMm, proud),
        slope: lens.slopeOf(yMm, proud, here.leanShareMm, here.bowShare),
        ownU: here.uMm / lens.sine,
        madeOf: here.madeOf,
        readingId: here.readingId,
        extrapolated: here.extrapolated,
      };
    },
  };
}

type Lens = {
  sine: number;
  /** Out of the set line → out of the wall's own corner. */
  yFromCorner: (yMm: number) => number;
  xOf: (yMm: number, proudMm: number) => number;
  slopeOf: (yMm: number, proudMm: number, leanShareMm: number, bowShare: number) => number[];
};

/** x = corner ± (y/tan θ′ + proud/sin θ′) and its derivatives, seen along the set line. */
function lensOf(frame: RunFrame, end: 'left' | 'right'): Lens {
  const turn = frame.turnDeg * DEG;
  const cos = Math.cos(turn);
  const sin = Math.sin(turn);
  const along = end === 'left' ? 0 : frame.length.value;
  const cornerX = along * cos - frame.standOffMm * sin;
  const cornerY = -along * sin - frame.standOffMm * cos;
  const into = end === 'left' ? 1 : -1;
  const theta = (angleToSetLine(frame, end) ?? 90) * DEG;
  // Exactly square is common and exact: no 1e-17 of a tangent.
  const cot = Math.abs(theta - Math.PI / 2) < 1e-12 ? 0 : 1 / Math.tan(theta);
  const sine = Math.sin(theta);
  const cosine = Math.cos(theta);
  const at = PARAMETER[end];
  return {
    sine,
    yFromCorner: (yMm) => yMm - cornerY,
    xOf: (yMm, proudMm) => cornerX + into * ((yMm - cornerY) * cot + proudMm / sine),
    slopeOf: (yMm, proudMm, leanShareMm, bowShare) => {
      const slope = [...NO_SLOPE];
      // A longer wall moves its right corner along it; how far behind the set line it lies stays as read.
      if (end === 'right') slope[PARAMETER.length] = cos;
      slope[at.angle] = (-into * DEG * (yMm - cornerY + proudMm * cosine)) / (sine * sine);
      slope[at.lean] = (into * leanShareMm) / sine;
      slope[at.bow] = (into * bowShare) / sine;
      return slope;
    },
  };
}

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
  return unique([...view.baseFrom, ...readingsBehind(place)]);
}

/** A term of a sum of places; the sign may be any weight. */
export type PlaceTerm = { place: FacePlace; sign: number };

/** Standard u of Σ sign·x over places, with what they share counted once. */
export function combinedU(covariance: number[][], terms: PlaceTerm[], otherU = 0): number {
  const slope = [...NO_SLOPE];
  let variance = otherU * otherU;
  for (const { place, sign } of samePlacesMerged(terms)) {
    for (let i = 0; i < PARAMETER_COUNT; i++) {
      slope[i] = (slope[i] ?? 0) + sign * (place.slope[i] ?? 0);
    }
    variance += (sign * place.ownU) ** 2;
  }
  return Math.sqrt(Math.max(0, variance + dot(slope, timesCovariance(covariance, slope))));
}

/** One place named twice is one reading, not two. */
function samePlacesMerged(terms: PlaceTerm[]): PlaceTerm[] {
  const merged: PlaceTerm[] = [];
  for (const term of terms) {
    const same = merged.find(
      ({ place }) =>
        place.end === term.place.end &&
        place.yMm === term.place.yMm &&
        place.zMm === term.place.zMm,
    );
    if (same) same.sign += term.sign;
    else merged.push({ ...term });
  }
  return merged;
}

/** A place with what must be kept clear of it, ready for many pairings. */
export type WeighedPlace = {
  place: FacePlace;
  clearMm: number;
  variance: number;
  covarianceSlope: number[];
};

/** Places with what must be kept clear of each, their variances reckoned once for many pairings. */
export function weigh(
  covariance: number[][],
  places: { place: FacePlace; clearMm: number }[],
): WeighedPlace[] {
  return places.map(({ place, clearMm }) => {
    const covarianceSlope = timesCovariance(covariance, place.slope);
    const variance = dot(place.slope, covarianceSlope) + place.ownU ** 2;
    return { place, clearMm, variance, covarianceSlope };
  });
}

/** Least of (room between − 2u) over every pair of places, each clear of its end. */
export function leastSafe(lefts: WeighedPlace[], rights: WeighedPlace[], otherU = 0): number {
  let least = Number.POSITIVE_INFINITY;
  for (const left of lefts) {
    for (const right of rights) {
      const shared = dot(left.place.slope, right.covarianceSlope);
      const variance = left.variance + right.variance - 2 * shared + otherU * otherU;
      const roomMm = right.place.xMm - right.clearMm - left.place.xMm - left.clearMm;
      least = Math.min(least, roomMm - 2 * Math.sqrt(Math.max(0, variance)));
    }
  }
  return least;
}

function timesCovariance(covariance: number[][], slope: readonly number[]): number[] {
  return covariance.map((row) => dot(row, slope));
}

function dot(a: readonly number[], b: readonly number[]): number {
  let sum = 0;
  for (let i = 0; i < PARAMETER_COUNT; i++) sum += (a[i] ?? 0) * (b[i] ?? 0);
  return sum;
}

function nodes(inside: number[], range: readonly [number, number]): number[] {
  const [from, to] = range;
  if (to <= from) return [from];
  return [from, ...inside.filter((value) => value > from + 1e-6 && value < to - 1e-6), to];
}

function unique(ids: readonly string[]): string[] {
  return [...new Set(ids)];
}
