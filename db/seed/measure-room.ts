import { randomUUID } from 'node:crypto';
import { type Reading, reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Room, Tool } from '@/lib/contracts/wall-book';
import type { AskedReading } from '@/lib/measure/missing-reading';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { formatLength } from '@/lib/units/format-length';
import {
  angleAt,
  cornerAt,
  facePoint,
  floorHeight,
  lengthOf,
  line,
  type Point,
  standsProud,
  type TrueRoom,
} from './true-room';

type MeasureInput = {
  truth: TrueRoom;
  room: Room;
  runs: Run[];
  rules: FitRules;
  tools: { tape: Tool; level: Tool };
  /** Between 0 and 1, from a seed: the hand is never quite still. */
  random: () => number;
  startedAt: Date;
  /** One reading goes wrong: the length of this wall at one height is this much too long. */
  misread?: { wallIndex: number; byMm: number; zMm: number };
};

/** Takes every reading that the program asks for, as a measurer would, off a room that is known. */
export function measureRoom(input: MeasureInput): Reading[] {
  const { room, runs, rules, tools } = input;
  const taken: Reading[] = [];
  const setUps = new Map<string, string>();
  for (let rounds = 0; rounds < 6; rounds += 1) {
    const missing = whatIsMissing(
      { room, readings: taken, tools: Object.values(tools) },
      runs,
      rules,
    );
    const before = taken.length;
    for (const { ask } of missing) {
      const takenAt = new Date(input.startedAt.getTime() + taken.length * 25_000).toISOString();
      const next = take(ask, input, setUps);
      if (next) taken.push(reading.parse({ id: randomUUID(), roomId: room.id, takenAt, ...next }));
    }
    if (taken.length === before) break;
  }
  return [...taken, ...moreStuds(input, taken)];
}

/** Two studs are asked for; who hangs boxes finds the rest of them behind. */
function moreStuds({ truth, room, runs, rules, tools }: MeasureInput, taken: Reading[]): Reading[] {
  const last = taken.at(-1);
  const hung = new Set(runs.filter(({ level }) => level === 'wall').map(({ wallId }) => wallId));
  const walls = room.chains.flatMap((chain) => chain.walls);
  return walls.flatMap((wall, index) => {
    if (!last || !hung.has(wall.id)) return [];
    const count = Math.floor(lengthOf(truth, index) / truth.studSpacingMm);
    return Array.from({ length: Math.max(0, count - 2) }, (_, place) => {
      const xMm = Math.round((truth.studSpacingMm * (place + 3)) / rules.stepMm) * rules.stepMm;
      return reading.parse({
        id: randomUUID(),
        roomId: room.id,
        toolId: tools.tape.id,
        unit: rules.unit,
        takenAt: new Date(Date.parse(last.takenAt) + (place + 1) * 15_000).toISOString(),
        kind: 'stud',
        wallId: wall.id,
        xMm,
        at: 'centre',
        typed: formatLength(xMm, { unit: rules.unit, stepMm: rules.stepMm }),
      });
    });
  });
}

function take(ask: AskedReading, input: MeasureInput, setUps: Map<string, string>) {
  const { truth, room, rules, tools } = input;
  const walls = room.chains.flatMap((chain) => chain.walls);
  const indexOf = (wallId: string) => walls.findIndex(({ id }) => id === wallId);
  const read = (trueMm: number, spreadMm = 0.8) => {
    const shaken = trueMm + (input.random() + input.random() - 1) * spreadMm;
    return Math.max(0, Math.round(shaken / rules.stepMm) * rules.stepMm);
  };
  const words = (...lengths: number[]) =>
    lengths
      .map((mm) => formatLength(mm, { unit: rules.unit, stepMm: rules.stepMm }))
      .join(' / ')
      .slice(0, 80);
  const setUpOf = (group: string) => {
    const known = setUps.get(group) ?? randomUUID();
    setUps.set(group, known);
    return known;
  };
  const common = { toolId: tools.tape.id, unit: rules.unit, touches: 'board' as const };
  const levelled = { ...common, toolId: tools.level.id };

  switch (ask.kind) {
    case 'length': {
      const index = indexOf(ask.wallId);
      const valueMm = read(lengthOf(truth, index, ask.zMm)) + slip(input, index, ask.zMm);
      const { wallId, zMm } = ask;
      return { ...common, kind: ask.kind, wallId, zMm, yMm: 0, valueMm, typed: words(valueMm) };
    }
    case 'corner': {
      const index = indexOf(ask.cornerWallId);
      const { cornerWallId, zMm, legMm, carriedPast } = ask;
      const [left, right] = legMarks(truth, index, zMm, legMm, carriedPast);
      const diagonalMm = read(distance(left, right), 0.5);
      const leg = read(legMm, 0);
      const by = {
        method: 'legs' as const,
        legLeftMm: leg,
        legRightMm: leg,
        diagonalMm,
        carriedPast,
      };
      return {
        ...common,
        kind: ask.kind,
        cornerWallId,
        zMm,
        by,
        typed: words(leg, leg, diagonalMm),
      };
    }
    case 'face': {
      const index = indexOf(ask.wallId);
      const gapMm = feeler(60 - standsProud(truth, index, ask.xMm, ask.zMm), input.random);
      const { wallId, xMm, zMm, setUpKind } = ask;
      const setUpId = setUpOf(ask.setUpGroup);
      const typed = `${gapMm} mm`;
      return {
        ...levelled,
        unit: 'mm' as const,
        kind: ask.kind,
        wallId,
        xMm,
        zMm,
        gapMm,
        setUpId,
        setUpKind,
        typed,
      };
    }
    case 'floor':
    case 'ceiling': {
      const index = indexOf(ask.wallId);
      const { from, along, into } = line(truth, index, 0);
      const { wallId, xMm, yMm } = ask;
      const place = {
        x: from.x + along.x * xMm + into.x * yMm,
        y: from.y + along.y * xMm + into.y * yMm,
      };
      const setUpId = setUpOf('level line');
      const lineMm = 1000;
      const placed = { ...levelled, wallId, xMm, yMm, setUpId };
      if (ask.kind === 'floor') {
        const dropMm = read(lineMm - floorHeight(truth, place), 0.6);
        return { ...placed, kind: ask.kind, dropMm, typed: words(dropMm) };
      }
      const riseMm = read(truth.ceilingMm - lineMm, 0.6);
      return { ...placed, kind: ask.kind, riseMm, typed: words(riseMm) };
    }
    case 'diagonal': {
      const from = cornerAt(truth, indexOf(ask.fromCornerWallId), ask.zMm);
      const valueMm = read(distance(from, cornerAt(truth, indexOf(ask.toCornerWallId), ask.zMm)));
      return { ...common, ...ask, valueMm, typed: words(valueMm) };
    }
    case 'stud': {
      const xMm = read(truth.studSpacingMm * ask.nth);
      const { wallId } = ask;
      return { ...common, kind: ask.kind, wallId, xMm, at: 'centre' as const, typed: words(xMm) };
    }
    case 'feature': {
      const { wallId, feature } = ask;
      const x0Mm = read(lengthOf(truth, indexOf(wallId)) * (feature === 'water' ? 0.4 : 0.44), 4);
      const place = { x0Mm, x1Mm: x0Mm + 50, z0Mm: read(480), z1Mm: read(530) };
      return { ...common, kind: ask.kind, wallId, feature, ...place, typed: words(x0Mm) };
    }
    case 'width':
      return null;
    case 'doorway':
      return {
        ...common,
        kind: ask.kind,
        name: 'Front door',
        clearWidthMm: read(812),
        clearHeightMm: read(2030),
        typed: words(812, 2030),
      };
  }
}

/** Where the two leg marks stand on the faces, bows and leans included. */
function legMarks(
  truth: TrueRoom,
  index: number,
  zMm: number,
  legMm: number,
  carriedPast: boolean,
): [Point, Point] {
  const leftIndex = (index - 1 + truth.walls.length) % truth.walls.length;
  const corner = cornerAt(truth, index, zMm);
  const right = facePoint(truth, index, legMm, zMm);
  if (!carriedPast)
    return [facePoint(truth, leftIndex, lengthOf(truth, leftIndex) - legMm, zMm), right];
  const { along } = line(truth, leftIndex, zMm);
  return [{ x: corner.x + along.x * legMm, y: corner.y + along.y * legMm }, right];
}

function slip({ misread }: MeasureInput, wallIndex: number, zMm: number): number {
  return misread?.wallIndex === wallIndex && Math.abs(misread.zMm - zMm) < 200 ? misread.byMm : 0;
}

const feeler = (mm: number, random: () => number) =>
  Math.round((mm + (random() - 0.5) * 0.6) * 2) / 2;

const distance = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);

/** Nominal angle of a corner as one would draw it: to the nearest of the usual ones. */
export function nominalAngle(truth: TrueRoom, index: number): number | null {
  const angle = angleAt(truth, index, 0);
  if (angle === null) return null;
  return [45, 90, 135, 225, 270, 315].reduce((best, usual) =>
    Math.abs(usual - angle) < Math.abs(best - angle) ? usual : best,
  );
}
