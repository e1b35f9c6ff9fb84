/** Islands and peninsulas: where they stand, on what floor, with what room to walk, over which pipes. */
import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { type Figure, figure } from './figure';
import { type KickPlace, kickAtPlaces } from './island-kicks';
import { isMeasured, isOfARoom, isSize, type Measured } from './measured';
import { type HalfMitre, halfMitre } from './mitre';
import { edgeDistance, type PlanEdge, type PlanPoint } from './plan-shapes';

export type IslandSide = 'back' | 'right' | 'front' | 'left';

export type IslandInput = {
  /** The set line it is parallel to: a place on it and its direction, clockwise from x seen from above. */
  setLine: { origin: PlanPoint; headingDeg: number };
  /** From the set line to the island's back, into the room. */
  offset: Measured;
  /** From the origin to the island's left end, along the set line. */
  along: Measured;
  lengthMm: number;
  depthMm: number;
  /** How far an open door or drawer stands out of each side; 0 where nothing opens. */
  opensMm: Record<IslandSide, number>;
  /** A peninsula's closed side: no aisle, no exposed corner. */
  joined: IslandSide | null;
  /** Fronts and walls it faces: their line in plan, and how far an open door stands out of them. */
  faces: { id: string; name: string; line: PlanEdge; u: number; opensMm: number }[];
  /** Drops from one level line; x along the set line from the origin, y into the room. */
  floor: KickPlace[];
  nominalKickMm: number;
  /** Drop to the datum it shares with a run, or null: its own high point. */
  datumDrop: Measured | null;
  legs: { minMm: number; maxMm: number };
  /** Standard u of the level line, mm per mm (`slopeUncertainty`). */
  uLevel: number;
  /** Angle the cabinets are built to at each exposed kick corner. */
  builtAngleDeg: number;
  /** Middle of the sink from the island's left end, or null. */
  sink: { alongMm: number; depthMm: number } | null;
  /** Where water and waste come up; x along the set line, y into the room. */
  services: { id: string; kind: 'water' | 'waste'; xMm: number; yMm: number; u: number }[];
};

export type IslandPlacement = {
  /** Clockwise from the back left, in plan. */
  corners: PlanPoint[];
  /** Kick heights at the corners and at every reading under it. */
  kicks: {
    xMm: number;
    yMm: number;
    height: Figure;
    legs: 'within' | 'too-low' | 'too-high';
    extrapolated: boolean;
  }[];
  /** Exposed corners of the kick, mitred at the built angle. */
  kickMitre: HalfMitre;
  exposedCorners: number;
  aisles: IslandAisle[];
  /** The narrowest of them; null when it faces nothing. */
  leastAisle: IslandAisle | null;
  /** From the sink's middle to each pipe, along and across the island. */
  services: { id: string; kind: 'water' | 'waste'; alongMm: Figure; acrossMm: Figure }[];
};

export type IslandAisle = {
  faceId: string;
  side: IslandSide;
  /** Between closed fronts. */
  clear: Figure;
  /** With the widest door of either side open. */
  clearOneOpen: Figure;
  /** With both open. */
  clearBothOpen: Figure;
  at: PlanPoint;
};

const SIDES: readonly IslandSide[] = ['back', 'right', 'front', 'left'];

/**
 * Places an island parallel to a named set line and works out all that hangs on where it stands.
 *
 * Frame: the set line's own x and y (into the room); corners in the plan of the line's origin. mm.
 * Edge: the aisle is the least distance from a side to the faces before it; the side that is joined has
 * none. Floor heights go straight between the readings; outside them the nearest carries on, marked.
 * Example: 1800 × 900, 1100 off the set line whose fronts stand at 600: an aisle of 500 to the fronts.
 * Problems: `size-impossible`, `floor-not-read`; warning `kick-out-of-legs`.
 * Source: geometry; common practice, no source.
 */
export function islandPlacement(input: IslandInput): Outcome<IslandPlacement> {
  const places = [
    input.offset,
    input.along,
    ...input.services.map(({ id, xMm, u }) => ({ value: xMm, u, from: [id] })),
    ...input.services.map(({ id, yMm, u }) => ({ value: yMm, u, from: [id] })),
  ];
  const isPlaced = places.every(isMeasured) && isOfARoom(input.setLine.headingDeg);
  if (!isSize(input.lengthMm) || !isSize(input.depthMm) || !isPlaced) {
    const about = [...input.offset.from, ...input.along.from];
    return refused(problem('size-impossible', 'A size of the island cannot be true.', about));
  }
  const mitre = halfMitre({ value: input.builtAngleDeg, u: 0, from: [] });
  const kicks = kickAtPlaces(input.floor, footprint(input), {
    nominalKickMm: input.nominalKickMm,
    datumDrop: input.datumDrop,
    legs: input.legs,
    uLevel: input.uLevel,
  });
  if (!mitre.value || !kicks.value) {
    return { value: null, problems: [...mitre.problems, ...kicks.problems] };
  }
  const corners = cornersOf(input);
  const aisles = SIDES.flatMap((side, i) => aislesOf(input, side, corners, i));
  const leastAisle = aisles.reduce<IslandAisle | null>(
    (least, aisle) => (!least || aisle.clear.value < least.clear.value ? aisle : least),
    null,
  );
  const outOfLegs = kicks.value.filter(({ legs }) => legs !== 'within');
  return {
    value: {
      corners,
      kicks: kicks.value,
      kickMitre: mitre.value,
      exposedCorners: input.joined ? 2 : 4,
      aisles,
      leastAisle,
      services: servicesOf(input),
    },
    problems:
      outOfLegs.length > 0
        ? [
            warning(
              'kick-out-of-legs',
              'The legs do not reach at some corner of the island. Shim, or change the kick.',
              outOfLegs.flatMap(({ height }) => height.from),
            ),
          ]
        : [],
  };
}

function footprint({ along, offset, lengthMm, depthMm }: IslandInput) {
  const [left, back] = [along.value, offset.value];
  return { leftMm: left, rightMm: left + lengthMm, backMm: back, frontMm: back + depthMm };
}

/** Back left, back right, front right, front left: the room lies to the right of the set line. */
function cornersOf(input: IslandInput): PlanPoint[] {
  const { leftMm, rightMm, backMm, frontMm } = footprint(input);
  const heading = (input.setLine.headingDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(heading), Math.sin(heading)];
  const { origin } = input.setLine;
  return [
    [leftMm, backMm],
    [rightMm, backMm],
    [rightMm, frontMm],
    [leftMm, frontMm],
  ].map(([x = 0, y = 0]) => ({
    xMm: origin.xMm + x * cos - y * sin,
    yMm: origin.yMm + x * sin + y * cos,
  }));
}

function aislesOf(
  input: IslandInput,
  side: IslandSide,
  corners: PlanPoint[],
  index: number,
): IslandAisle[] {
  const from = corners[index];
  const to = corners[(index + 1) % corners.length];
  if (side === input.joined || !from || !to) return [];
  return input.faces.flatMap((face) => {
    if (!isBefore({ from, to }, face.line)) return [];
    const { distanceMm, on } = edgeDistance({ from, to }, face.line);
    const u = Math.hypot(
      face.u,
      side === 'left' || side === 'right' ? input.along.u : input.offset.u,
    );
    const ids = [...input.offset.from, ...input.along.from];
    const open = input.opensMm[side];
    const less = (taken: number) => figure(distanceMm - taken, u, ids);
    return [
      {
        faceId: face.id,
        side,
        clear: less(0),
        clearOneOpen: less(Math.max(open, face.opensMm)),
        clearBothOpen: less(open + face.opensMm),
        at: on,
      },
    ];
  });
}

/** The face lies on the outer side of the island's side, and not merely round its corner. */
function isBefore(side: PlanEdge, face: PlanEdge): boolean {
  const dx = side.to.xMm - side.from.xMm;
  const dy = side.to.yMm - side.from.yMm;
  const length = Math.hypot(dx, dy);
  const outward = [face.from, face.to].map(
    (point) => ((point.xMm - side.from.xMm) * dy - (point.yMm - side.from.yMm) * dx) / length,
  );
  const along = [face.from, face.to].map(
    (point) => ((point.xMm - side.from.xMm) * dx + (point.yMm - side.from.yMm) * dy) / length,
  );
  const beside = Math.max(...along) > 1e-6 && Math.min(...along) < length - 1e-6;
  return beside && Math.max(...outward) > 0 && Math.min(...outward) > -1e-6;
}

function servicesOf(input: IslandInput): IslandPlacement['services'] {
  const { sink } = input;
  if (!sink) return [];
  const { leftMm, backMm } = footprint(input);
  return input.services.map(({ id, kind, xMm, yMm, u }) => ({
    id,
    kind,
    alongMm: figure(xMm - (leftMm + sink.alongMm), Math.hypot(u, input.along.u), [
      id,
      ...input.along.from,
    ]),
    acrossMm: figure(yMm - (backMm + sink.depthMm), Math.hypot(u, input.offset.u), [
      id,
      ...input.offset.from,
    ]),
  }));
}
