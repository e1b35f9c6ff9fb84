/** The set line behind every run of a fit: who shares a plane, who shares a turn, what is fixed. */
import type { Run } from '@/lib/contracts/runs';
import type { FacePoint } from '@/lib/measure/face';
import { type Figure, figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { hasTallUnit } from '@/lib/measure/plan-levels';
import { frontDepth } from '@/lib/measure/room-walk';
import { type SetLinePlane, setLine } from '@/lib/measure/set-line';
import type { SetLine } from '@/lib/measure/set-line-gaps';
import type { Problem } from '@/lib/problem';

/** The plane of one run in its wall's frame: s = standOff + slope · x. */
export type RunPlane = {
  standOffMm: number;
  /** mm per mm. */
  slope: number;
  turnDeg: number;
  xLeftMm: number;
  xRightMm: number;
  u: number;
  /** Nobody read the face: the straight line corner to corner is assumed. */
  assumed: boolean;
  /** Ids of the runs whose turn it shares, or that fix it. */
  turnFixedBy: string[];
  /** Null where assumed. */
  line: SetLine | null;
};

export type SetLineRequest = {
  run: Run;
  /** Where along the wall the cabinets stand, as far as known. */
  bandMm: readonly [number, number];
  edgesMm: number[];
};

type Group = {
  /** One plane for each: runs of one wall that a tall unit ties share it. */
  planes: { id: string; wallId: string; runs: SetLineRequest[]; shear: number }[];
};

/**
 * The set line of every run asked for.
 * Edge rule: runs joined by a corner unit share one turn, square across the corner; runs of one wall tied
 * by a tall unit share one plane; a cabinet already set fixes both. A wall whose face nobody read is
 * taken as straight from corner to corner.
 * Problems: those of `setLine`, but `face-not-read`, which is said by what is missing.
 */
export function fitSetLines(
  context: FitContext,
  requests: SetLineRequest[],
): { planes: Map<string, RunPlane>; problems: Problem[] } {
  const planes = new Map<string, RunPlane>();
  const problems: Problem[] = [];
  for (const group of groupRuns(context, requests)) {
    problems.push(...solveGroup(context, group, planes));
  }
  return { planes, problems };
}

/** The straight lines corner to corner, or what is already set: near enough to lay the boxes out on. */
export function assumedSetLines(
  context: FitContext,
  requests: SetLineRequest[],
): Map<string, RunPlane> {
  const planes = new Map<string, RunPlane>();
  for (const group of groupRuns(context, requests)) {
    const turn = fixedTurn(group) ?? 0;
    for (const plane of group.planes) {
      const slope = turn + plane.shear;
      const turnDeg = (Math.atan(slope) * 180) / Math.PI;
      const placed = assumedPlane(context, plane, slope);
      for (const { run } of plane.runs) {
        planes.set(run.id, { ...placed, turnDeg, line: null, turnFixedBy: [] });
      }
    }
  }
  return planes;
}

/** The turn that a cabinet already set fixes for its whole group, less the shear of its own plane. */
function fixedTurn(group: Group): number | null {
  for (const plane of group.planes) {
    const fixed = existingOf(plane);
    if (fixed) return Math.tan((fixed.turnDeg * Math.PI) / 180) - fixed.shear;
  }
  return null;
}

function solveGroup(context: FitContext, group: Group, found: Map<string, RunPlane>): Problem[] {
  const read = group.planes.map((plane) => planeInput(context, plane));
  const withFaces = read.flatMap((plane) => (plane.points.length > 0 ? [plane] : []));
  const fixed = fixedTurn(group);
  const turn = fixed === null ? null : figure(fixed, 0, []);
  const solved = withFaces.length > 0 ? setLine({ planes: withFaces, turn, uReference: 0 }) : null;
  const sharedTurn = solved?.value?.turn.value ?? turn?.value ?? 0;
  const runIds = group.planes.flatMap(({ runs }) => runs.map(({ run }) => run.id));
  for (const plane of group.planes) {
    const line = solved?.value?.lines.find(({ id }) => id === plane.id) ?? null;
    const slope = sharedTurn + plane.shear;
    const placed = line
      ? planeOfLine(line, plane.shear, slope)
      : assumedPlane(context, plane, slope);
    for (const { run } of plane.runs) {
      found.set(run.id, {
        ...placed,
        turnDeg: (Math.atan(slope) * 180) / Math.PI,
        line,
        turnFixedBy: runIds.filter((id) => id !== run.id),
      });
    }
  }
  return (solved?.problems ?? []).filter(({ code }) => code !== 'face-not-read');
}

type Placed = Omit<RunPlane, 'turnDeg' | 'line' | 'turnFixedBy'>;

function planeOfLine(line: SetLine, shear: number, slope: number): Placed {
  const { atLeft, atRight } = line;
  return {
    standOffMm: atLeft.s.value + shear * atLeft.xMm - slope * atLeft.xMm,
    slope,
    xLeftMm: atLeft.xMm,
    xRightMm: atRight.xMm,
    u: Math.max(atLeft.s.u, atRight.s.u),
    assumed: false,
  };
}

/** Clear of the straight line corner to corner, and no more. */
function assumedPlane(context: FitContext, plane: Group['planes'][number], slope: number): Placed {
  const existing = existingOf(plane);
  const ends = plane.runs.flatMap(({ bandMm }) => [...bandMm]);
  const xLeftMm = Math.min(...ends);
  const xRightMm = Math.max(...ends);
  const standOffMm = existing
    ? existing.s.value - slope * existing.atMm
    : Math.max(-slope * xLeftMm, -slope * xRightMm);
  const u = context.rules.usualBowMm / Math.sqrt(3);
  return { standOffMm, slope, xLeftMm, xRightMm, u, assumed: true };
}

function planeInput(context: FitContext, plane: Group['planes'][number]): SetLinePlane {
  const placed = context.placed.get(plane.wallId) ?? [];
  const points = placed.map(
    ({ id, xMm, zMm, sMm, u }): FacePoint => ({
      id,
      xMm,
      zMm,
      sMm: sMm - plane.shear * xMm,
      u,
      // All set-ups are in the wall's frame already.
      setUpId: plane.wallId,
    }),
  );
  const existing = existingOf(plane);
  return {
    id: plane.id,
    points,
    bands: plane.runs.map(({ run, bandMm }) => ({
      x0Mm: bandMm[0],
      x1Mm: bandMm[1],
      z0Mm: run.z0Mm,
      z1Mm: run.z1Mm,
    })),
    edgesMm: [...new Set(plane.runs.flatMap(({ edgesMm }) => edgesMm))],
    finishedEndMm: finishedEndOf(plane),
    fixed: existing
      ? {
          atMm: existing.atMm,
          s: { ...existing.s, value: existing.s.value - plane.shear * existing.atMm },
        }
      : null,
  };
}

function finishedEndOf({ runs }: Group['planes'][number]): number | null {
  for (const { run, bandMm } of runs) {
    if (run.leastGapAt) return run.leastGapAt === 'left' ? bandMm[0] : bandMm[1];
  }
  return null;
}

type Existing = { atMm: number; s: Figure; turnDeg: number; shear: number };

/** A cabinet already set whose back was read. */
function existingOf(plane: Group['planes'][number]): Existing | null {
  for (const { run } of plane.runs) {
    for (const end of [run.left, run.right]) {
      if (end.kind !== 'existing' || end.standOffMm === undefined) continue;
      return {
        atMm: end.xMm,
        s: figure(end.standOffMm, 0, []),
        turnDeg: end.turnDeg ?? 0,
        shear: plane.shear,
      };
    }
  }
  return null;
}

/** Runs that share a plane or a turn, in the order given. */
function groupRuns(context: FitContext, requests: SetLineRequest[]): Group[] {
  const byRun = new Map(requests.map((request) => [request.run.id, request]));
  const planes = tiedByTall(requests);
  const planeOf = new Map(
    planes.flatMap((plane) => plane.map(({ run }) => [run.id, plane] as const)),
  );
  const seen = new Set<SetLineRequest[]>();
  return planes.flatMap((first): Group[] => {
    if (seen.has(first)) return [];
    const group: Group = { planes: [] };
    const queue: { plane: SetLineRequest[]; shear: number }[] = [{ plane: first, shear: 0 }];
    for (let next = queue.shift(); next; next = queue.shift()) {
      const { plane, shear } = next;
      if (seen.has(plane)) continue;
      seen.add(plane);
      const wallId = plane[0]?.run.wallId ?? '';
      group.planes.push({ id: plane[0]?.run.id ?? '', wallId, runs: plane, shear });
      for (const { run } of plane) {
        for (const joined of joinedByCornerUnit(context, byRun, run)) {
          const other = planeOf.get(joined.runId);
          if (other) queue.push({ plane: other, shear: shear + joined.shear });
        }
      }
    }
    return [group];
  });
}

function tiedByTall(requests: SetLineRequest[]): SetLineRequest[][] {
  const tied = new Map<string, SetLineRequest[]>();
  const planes: SetLineRequest[][] = [];
  const tallWalls = new Set(
    requests
      .filter(({ run }) => run.level === 'tall' || hasTallUnit(run))
      .map(({ run }) => run.wallId),
  );
  for (const request of requests) {
    const { wallId } = request.run;
    const known = tallWalls.has(wallId) ? tied.get(wallId) : undefined;
    if (known) {
      known.push(request);
      continue;
    }
    const plane = [request];
    planes.push(plane);
    if (tallWalls.has(wallId)) tied.set(wallId, plane);
  }
  return planes;
}

/**
 * Runs square to this one across a corner unit, with how much more they turn against their own wall:
 * the corner unit is square, the corner is θ, so ψ(left wall) − ψ(right wall) = nominal − θ.
 */
function joinedByCornerUnit(
  context: FitContext,
  byRun: ReadonlyMap<string, SetLineRequest>,
  run: Run,
): { runId: string; shear: number }[] {
  const frame = context.frames.get(run.wallId);
  const walked = context.walk.byId.get(run.wallId);
  return (['left', 'right'] as const).flatMap((end) => {
    const meets = run[end];
    const adjusted = frame?.[end];
    const nominal = end === 'left' ? walked?.leftCornerDeg : walked?.rightCornerDeg;
    if (meets.kind !== 'run' || meets.through !== 'corner-unit' || !adjusted || !nominal) return [];
    if (byRun.get(meets.runId)?.run.wallId !== adjusted.wallId) return [];
    const outOfSquare = Math.tan(((adjusted.angle.value - nominal) * Math.PI) / 180);
    return [{ runId: meets.runId, shear: end === 'left' ? -outOfSquare : outOfSquare }];
  });
}

/** Where along its wall a run stands before it is filled: clear of what its ends meet. */
export function firstBand(context: FitContext, run: Run): readonly [number, number] {
  const lengthMm = context.frames.get(run.wallId)?.length.value ?? 0;
  const at = (end: 'left' | 'right'): number => {
    const meets = run[end];
    const fromEnd = (inMm: number) => (end === 'left' ? inMm : lengthMm - inMm);
    switch (meets.kind) {
      case 'open':
        return meets.limitMm;
      case 'casing':
      case 'existing':
        return meets.xMm;
      case 'run': {
        const other = context.runById.get(meets.runId);
        const stands = meets.through === 'other' || meets.through === 'both-stop';
        return fromEnd(stands && other ? frontDepth(other) : 0);
      }
      case 'wall':
        return fromEnd(0);
    }
  };
  const ends = [at('left'), at('right')] as const;
  return [Math.min(...ends), Math.max(...ends)];
}
