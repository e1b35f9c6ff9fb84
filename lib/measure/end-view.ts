/** One end of a run as seen from its set line: where its face stands at any place, and how sure. */
import { type FaceSurface, type FaceValue, faceSurface } from '@/lib/measure/face-surface';
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
/** A place that no parameter of the frame moves. */
export const NO_SLOPE: readonly number[] = new Array<number>(PARAMETER_COUNT).fill(0);

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

function unique(ids: readonly string[]): string[] {
  return [...new Set(ids)];
}
