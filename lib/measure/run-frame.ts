/** The frame of a run: its set line against the wall's corners, and what stands at its two ends. */
import type { EndFacePoint } from '@/lib/measure/face-surface';
import type { Figure } from '@/lib/measure/figure';

export type WallEnd = {
  meets: 'wall';
  /** Interior angle between the straight lines corner to corner, degrees. */
  angle: Figure;
  /** Of the end wall, mm per mm, positive into the room as z grows. */
  lean: Figure;
  /** Middle of the end wall proud of its straight line where nobody read it: 0 ± the usual bow. */
  bow: Figure;
  usualBowMm: number;
  wallLengthMm: number;
  points: EndFacePoint[];
};
export type OtherRunEnd = {
  meets: 'run';
  /** Between this run's wall and the other's, degrees. */
  angle: Figure;
  /** The other's set line turns this much against its wall, positive further out at its right. */
  otherTurnDeg: number;
  /** From the other's wall at the corner to its door fronts (or to the end of a corner unit's arm). */
  frontMm: number;
  frontUMm: number;
  from: string[];
};
/** A plane square to the run: the limit of an open end, a casing, a cabinet already set. */
export type PlaneEnd = {
  meets: 'plane';
  /** Along the wall from its left corner. */
  x: Figure;
};
export type EndFace = WallEnd | OtherRunEnd | PlaneEnd;

export type RunFrame = {
  /** Adjusted wall length at zRef, corner to corner. */
  length: Figure;
  zRefMm: number;
  /** Set line's distance from the straight line corner to corner, at the left corner. */
  standOffMm: number;
  /** Turn of the set line, positive further out at the right. */
  turnDeg: number;
  left: EndFace;
  right: EndFace;
  /**
   * Of the seven parameters in the order of `PARAMETER`, where the adjustment or a reading at the front
   * ties them together; left out: each figure's own u² alone.
   */
  covariance?: number[][];
};

/** Length mm, angles deg, leans mm/mm, bows mm. */
export const PARAMETER = {
  length: 0,
  left: { angle: 1, lean: 3, bow: 5 },
  right: { angle: 2, lean: 4, bow: 6 },
} as const;
export const PARAMETER_COUNT = 7;

/** Covariance of the frame's parameters, from the figures where none was given. */
export function frameCovariance(frame: RunFrame): number[][] {
  if (frame.covariance) return frame.covariance;
  const variance = new Array<number>(PARAMETER_COUNT).fill(0);
  variance[PARAMETER.length] = frame.length.u ** 2;
  for (const end of ['left', 'right'] as const) {
    const face = frame[end];
    const at = PARAMETER[end];
    if (face.meets !== 'plane') variance[at.angle] = face.angle.u ** 2;
    if (face.meets !== 'wall') continue;
    variance[at.lean] = face.lean.u ** 2;
    variance[at.bow] = face.bow.u ** 2;
  }
  return variance.map((value, i) => variance.map((_, j) => (i === j ? value : 0)));
}

/** Angle between the set line and the end face (or the other run's front), degrees; null at a plane. */
export function angleToSetLine(frame: RunFrame, end: 'left' | 'right'): number | null {
  const face = frame[end];
  if (face.meets === 'plane') return null;
  const own = end === 'left' ? -frame.turnDeg : frame.turnDeg;
  if (face.meets === 'wall') return face.angle.value + own;
  return face.angle.value + own + (end === 'left' ? face.otherTurnDeg : -face.otherTurnDeg);
}
