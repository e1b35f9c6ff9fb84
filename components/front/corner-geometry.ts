/** Where things stand on the drawing of a corner, in its own units; x along this wall, y into the room. */
export type Point = { x: number; y: number };

export type CornerPlan = {
  leftEnd: Point;
  rightEnd: Point;
  outer: { left: Point; corner: Point; right: Point };
  leftMark: Point;
  rightMark: Point;
  /** How many times the out-of-true is drawn. */
  times: number;
  /** The wedge between the left wall and a square cabinet; null where the corner is not square. */
  wedge: [Point, Point, Point] | null;
  cabinet: { x: number; y: number; width: number; height: number } | null;
};

export type CornerShape = {
  legLeftMm: number;
  legRightMm: number;
  depthMm: number;
  thetaDeg: number;
  /** Null: drawn as it is, without a cabinet. */
  offsetMm: number | null;
};

/** Drawn length of the longer wall, and the thickness of a wall. */
const longest = 300;
const thickness = 13;
/** The out-of-true is drawn as large as can be, and no larger than this share of the depth. */
const mostShare = 0.34;
const magnifications = [50, 20, 10, 5, 2, 1];

export function cornerPlan({
  legLeftMm,
  legRightMm,
  depthMm,
  thetaDeg,
  offsetMm,
}: CornerShape): CornerPlan {
  const scale = longest / (Math.max(legLeftMm, legRightMm, depthMm * 1.6) * 1.12);
  const depth = depthMm * scale;
  const times = offsetMm === null ? 1 : magnification(offsetMm, depthMm);
  const lean = (offsetMm ?? 0) * scale * times;
  const along = offsetMm === null ? directionOf(thetaDeg) : unit({ x: lean, y: depth });
  const reach = (lengthMm: number) => Math.max(lengthMm, depthMm * 1.25) * scale;
  const leftEnd = stretched(along, reach(legLeftMm) + 22);
  const rightEnd = { x: reach(legRightMm) + 22, y: 0 };
  // Square to the left wall, away from the room.
  const outward = { x: -along.y * thickness, y: along.x * thickness };
  const cabinetX = Math.max(lean, 0);
  return {
    leftEnd,
    rightEnd,
    outer: {
      left: { x: leftEnd.x + outward.x, y: leftEnd.y + outward.y },
      corner: { x: (-thickness * (along.x + 1)) / along.y, y: -thickness },
      right: { x: rightEnd.x, y: -thickness },
    },
    leftMark: stretched(along, legLeftMm * scale),
    rightMark: { x: legRightMm * scale, y: 0 },
    times,
    wedge:
      offsetMm === null
        ? null
        : [
            { x: 0, y: 0 },
            { x: lean, y: depth },
            lean > 0 ? { x: lean, y: 0 } : { x: 0, y: depth },
          ],
    cabinet: offsetMm === null ? null : { x: cabinetX, y: 0, width: depth * 0.75, height: depth },
  };
}

function magnification(offsetMm: number, depthMm: number): number {
  const share = Math.abs(offsetMm) / depthMm;
  return magnifications.find((times) => share * times <= mostShare) ?? 1;
}

function directionOf(thetaDeg: number): Point {
  const radians = (thetaDeg * Math.PI) / 180;
  return { x: Math.cos(radians), y: Math.sin(radians) };
}

function unit({ x, y }: Point): Point {
  const length = Math.hypot(x, y);
  return { x: x / length, y: y / length };
}

function stretched({ x, y }: Point, by: number): Point {
  return { x: x * by, y: y * by };
}
