/** What stands at the two ends of a run: the face it meets and the filler rules that hold there. */
import type { Run, Unit } from '@/lib/contracts/runs';
import type { AdjustedFrame } from '@/lib/measure/adjusted-frame';
import type { EndFacePoint } from '@/lib/measure/face-surface';
import { figure } from '@/lib/measure/figure';
import type { FillEnd } from '@/lib/measure/fill-side';
import { type FitContext, SURE_ANGLE_U_DEG, SURE_LENGTH_U_MM } from '@/lib/measure/fit-context';
import type { RunPlane } from '@/lib/measure/fit-set-lines';
import { frontDepth } from '@/lib/measure/room-walk';
import type { RunEndFit } from '@/lib/measure/run-fit';
import type { EndFace, RunFrame } from '@/lib/measure/run-frame';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import { type Outcome, problem } from '@/lib/problem';

export type RunEnd = { face: EndFace; rule: FillEnd; meets: RunEndFit['meets']; words: string };
export type FramedRun = { frame: RunFrame; left: RunEnd; right: RunEnd };

/** A drawer or roll-out beside a wall needs this much filler to clear a casing; ref F05, J. */
const DRAWER_BESIDE_WALL_MM = 38.1;
/** Beside a dishwasher or range in a corner; refs F03–F04, F19. */
const APPLIANCE_IN_CORNER_MM = 114.3;
/** Flatter than this a corner gives no face to fill against. */
const OPEN_CORNER_DEG = 170;
/** How far beyond the door fronts an end wall's readings still shape its face. */
const BEYOND_FRONT_MM = 1_000;

/**
 * The run's frame with both its ends; null when its wall's length or a corner it runs to was not read.
 * Edge rule: an end whose wall turns away, or that has no wall, is open at the wall's own end.
 * Problems: `length-not-read`, `corner-not-read`, `other-run-missing`.
 */
export function frameRun(
  context: FitContext,
  run: Run,
  planes: ReadonlyMap<string, RunPlane>,
): Outcome<FramedRun> {
  const adjusted = context.frames.get(run.wallId);
  const walked = context.walk.byId.get(run.wallId);
  const plane = planes.get(run.id);
  if (!adjusted || !walked || !plane) {
    const words = `Run ${run.name}: too little is read to lay out its wall.`;
    return { value: null, problems: [problem('length-not-read', words, [run.id])] };
  }
  const left = endOf(context, run, 'left', adjusted, planes, plane);
  const right = endOf(context, run, 'right', adjusted, planes, plane);
  const usesLength = right.value?.face.meets !== 'plane';
  const problems = [...left.problems, ...right.problems];
  if (usesLength && adjusted.length.u > SURE_LENGTH_U_MM) {
    const words = `Run ${run.name}: read the length of wall ${walked.wall.name}.`;
    problems.push(problem('length-not-read', words, [run.id]));
  }
  if (!left.value || !right.value || problems.some(({ severity }) => severity === 'error')) {
    return { value: null, problems };
  }
  const frame: RunFrame = {
    length: adjusted.length,
    zRefMm: adjusted.zRefMm,
    standOffMm: plane.standOffMm,
    turnDeg: plane.turnDeg,
    left: left.value.face,
    right: right.value.face,
    covariance: adjusted.covariance,
  };
  return { value: { frame, left: left.value, right: right.value }, problems };
}

function endOf(
  context: FitContext,
  run: Run,
  end: 'left' | 'right',
  adjusted: AdjustedFrame,
  planes: ReadonlyMap<string, RunPlane>,
  plane: RunPlane,
): Outcome<RunEnd> {
  const meets = run[end];
  switch (meets.kind) {
    case 'wall':
      return wallEnd(context, run, end, adjusted, plane);
    case 'open':
      return { value: openEnd(meets.limitMm, 0, []), problems: [] };
    case 'casing': {
      const rule = fillerRule(context, run, end, 'wall');
      return {
        value: planeEnd('casing', 'casing', placeRead(context, meets.xMm), rule),
        problems: [],
      };
    }
    case 'existing': {
      // Boxes butt against what is set; only between two such does a filler close the gap.
      const other = run[end === 'left' ? 'right' : 'left'];
      const mostMm = other.kind === 'existing' ? context.rules.fillerMostMm : 0;
      const rule = { leastMm: 0, mostMm, isOpen: false, gableClearanceMm: 0 };
      const x = placeRead(context, meets.xMm);
      return { value: planeEnd('existing', 'cabinet already set', x, rule), problems: [] };
    }
    case 'run':
      return meets.through === 'this'
        ? wallEnd(context, run, end, adjusted, plane)
        : otherRunEnd(context, run, end, adjusted, planes);
  }
}

/** A place read along a wall by hand: as sure as the first tape of the book. */
function placeRead(context: FitContext, xMm: number) {
  const tape = context.book.toolOf(context.book.readings[0] ?? { toolId: '' });
  return figure(xMm, lengthUncertainty(tape, xMm, 1), []);
}

function planeEnd(
  meets: 'casing' | 'existing',
  words: string,
  x: ReturnType<typeof figure>,
  rule: FillEnd,
): RunEnd {
  return { face: { meets: 'plane', x }, rule, meets, words };
}

function openEnd(xMm: number, u: number, from: string[]): RunEnd {
  return {
    face: { meets: 'plane', x: figure(xMm, u, from) },
    rule: { leastMm: 0, mostMm: 0, isOpen: true, gableClearanceMm: 0 },
    meets: 'open',
    words: 'open end',
  };
}

function wallEnd(
  context: FitContext,
  run: Run,
  end: 'left' | 'right',
  adjusted: AdjustedFrame,
  plane: RunPlane,
): Outcome<RunEnd> {
  const side = adjusted[end];
  if (!side || side.angle.value >= OPEN_CORNER_DEG) {
    const length = adjusted.length;
    const value = end === 'left' ? openEnd(0, 0, []) : openEnd(length.value, length.u, length.from);
    return { value, problems: [] };
  }
  const notRead = cornerNotRead(context, run, end, adjusted);
  if (notRead) return notRead;
  const name = context.walk.byId.get(side.wallId)?.wall.name ?? '';
  return {
    value: {
      face: {
        meets: 'wall',
        angle: side.angle,
        lean: side.lean,
        bow: side.bow,
        usualBowMm: context.rules.usualBowMm,
        wallLengthMm: side.wallLengthMm,
        points: endFacePoints(context, run, end, side, plane, adjusted.length.value),
      },
      rule: fillerRule(context, run, end, 'wall'),
      meets: 'wall',
      words: `wall ${name}`,
    },
    problems: [],
  };
}

function cornerNotRead(
  context: FitContext,
  run: Run,
  end: 'left' | 'right',
  adjusted: AdjustedFrame,
): Outcome<RunEnd> | null {
  const side = adjusted[end];
  if (side && side.angle.u <= SURE_ANGLE_U_DEG) return null;
  const walked = context.walk.byId.get(run.wallId);
  const neighbour = end === 'left' ? walked?.before : walked?.after;
  const names = end === 'left' ? [neighbour, walked?.wall] : [walked?.wall, neighbour];
  const corner = names.map((wall) => wall?.name ?? '').join('–');
  const words = `Run ${run.name}: read the corner ${corner}.`;
  return { value: null, problems: [problem('corner-not-read', words, [run.id])] };
}

function otherRunEnd(
  context: FitContext,
  run: Run,
  end: 'left' | 'right',
  adjusted: AdjustedFrame,
  planes: ReadonlyMap<string, RunPlane>,
): Outcome<RunEnd> {
  const meets = run[end];
  const side = adjusted[end];
  const other = meets.kind === 'run' ? context.runById.get(meets.runId) : undefined;
  const otherPlane = other ? planes.get(other.id) : undefined;
  if (meets.kind !== 'run' || !other || !otherPlane || !side || other.wallId !== side.wallId) {
    const words = `Run ${run.name}: the run it meets at the ${end} is not on the next wall.`;
    return { value: null, problems: [problem('other-run-missing', words, [run.id])] };
  }
  const notRead = cornerNotRead(context, run, end, adjusted);
  if (notRead) return notRead;
  // At this run's left corner the other wall ends, at its right corner it begins.
  const cornerX = end === 'left' ? (context.frames.get(other.wallId)?.length.value ?? 0) : 0;
  const standsOffMm = otherPlane.standOffMm + otherPlane.slope * cornerX;
  const isJoined = meets.through === 'corner-unit';
  const frontMm = standsOffMm + (isJoined ? armAt(run, other, end) : frontDepth(other));
  return {
    value: {
      face: {
        meets: 'run',
        angle: side.angle,
        otherTurnDeg: otherPlane.turnDeg,
        frontMm,
        frontUMm: otherPlane.u,
        from: [],
      },
      rule: isJoined
        ? { leastMm: 0, mostMm: 0, isOpen: false, gableClearanceMm: 0 }
        : fillerRule(context, run, end, other),
      meets: 'run',
      words: otherWords(other, meets.through),
    },
    problems: [],
  };
}

function otherWords(other: Run, through: 'this' | 'other' | 'both-stop' | 'corner-unit'): string {
  if (through === 'other') return `run ${other.name}, which goes through`;
  if (through === 'both-stop') return `run ${other.name}; both stop at the corner`;
  return `run ${other.name}, by the corner unit`;
}

/** How far the corner unit reaches along this wall from the other run's set line. */
function armAt(run: Run, other: Run, end: 'left' | 'right'): number {
  const own = unitAt(run, end);
  // This run holds the corner unit: its back stands on the other's set line.
  if (own?.kind === 'corner') return 0;
  const corner = unitAt(other, end === 'left' ? 'right' : 'left');
  return corner?.kind === 'corner' ? (corner.armMm ?? corner.widthMm) : frontDepth(other);
}

/** The unit that stands at an end. */
export function unitAt(run: Run, end: 'left' | 'right'): Unit | undefined {
  return end === 'left' ? run.units[0] : run.units[run.units.length - 1];
}

const isAppliance = (unit: Unit | undefined) =>
  unit?.kind === 'dishwasher' || unit?.kind === 'range';

/** Least and most of a filler: beside a wall, or at an inside corner by what opens there. */
function fillerRule(
  context: FitContext,
  run: Run,
  end: 'left' | 'right',
  beside: 'wall' | Run,
): FillEnd {
  const { rules } = context;
  const own = unitAt(run, end);
  if (beside === 'wall') {
    const drawers = own?.kind === 'drawers' ? DRAWER_BESIDE_WALL_MM : 0;
    const leastMm = Math.max(rules.fillerLeastMm, drawers);
    const gableClearanceMm = rules.gableClearanceMm;
    return {
      leastMm,
      mostMm: Math.max(rules.fillerMostMm, leastMm),
      isOpen: false,
      gableClearanceMm,
    };
  }
  const other = unitAt(beside, end === 'left' ? 'right' : 'left');
  const least = Math.max(
    rules.cornerFillerDoorsMm,
    other?.kind === 'drawers' || own?.kind === 'drawers' ? rules.cornerFillerDrawersMm : 0,
    isAppliance(other) || isAppliance(own) ? APPLIANCE_IN_CORNER_MM : 0,
  );
  const spareMm = Math.max(0, rules.fillerMostMm - rules.fillerLeastMm);
  return { leastMm: least, mostMm: least + spareMm, isOpen: false, gableClearanceMm: 0 };
}

/** The end wall's face readings that shape what this run meets, in its own frame. */
function endFacePoints(
  context: FitContext,
  run: Run,
  end: 'left' | 'right',
  side: NonNullable<AdjustedFrame['left']>,
  plane: RunPlane,
  lengthMm: number,
): EndFacePoint[] {
  const turn = (plane.turnDeg * Math.PI) / 180;
  const cornerX = end === 'left' ? 0 : lengthMm;
  const cornerY = -cornerX * Math.sin(turn) - plane.standOffMm * Math.cos(turn);
  const toLine = ((side.angle.value + (end === 'left' ? -1 : 1) * plane.turnDeg) * Math.PI) / 180;
  const depthMm = frontDepth(run);
  const placed = context.placed.get(side.wallId) ?? [];
  const points = placed.map((face): EndFacePoint => {
    const alongMm = end === 'left' ? side.wallLengthMm - face.xMm : face.xMm;
    return {
      yMm: cornerY + alongMm * Math.sin(toLine),
      zMm: face.zMm,
      proudMm: face.sMm,
      uMm: face.u,
      leanShareMm: face.leanShareMm,
      bowShare: face.bowShare,
      readingId: face.id,
    };
  });
  return points.filter(({ yMm }) => yMm >= cornerY - 1 && yMm <= depthMm + BEYOND_FRONT_MM);
}
