/** Floor and ceiling, from one level line thrown round the room. */
import type { Run } from '@/lib/contracts/runs';
import { planBareLevels } from '@/lib/measure/plan-bare-room';
import {
  type AskedSlot,
  extentOf,
  lengthSoFar,
  lengthWords,
  type PlanContext,
  runsOn,
  spreadPlaces,
} from '@/lib/measure/plan-context';
import { frontDepth, type WalkedWall } from '@/lib/measure/room-walk';

/** Every two feet at the kick line and at the wall (ref M08–M09). */
const FLOOR_SPACING_MM = 610;
const CEILING_SPACING_MM = 1_500;
/** Where the foot of a tape stands at a wall or at the end of a run; from memory. */
const OFF_THE_WALL_MM = 30;
/** Boxes that end this near to the ceiling are closed to it. */
const NEAR_CEILING_MM = 2_000;
const SET_UP_GROUP = 'level';

/** Floor and ceiling wall by wall, all from one level line. */
export function planLevels(context: PlanContext): AskedSlot[] {
  const last = context.readings.findLast(
    (reading) => reading.kind === 'floor' || reading.kind === 'ceiling',
  );
  const setUpId = last && 'setUpId' in last ? last.setUpId : null;
  return context.walk.walls.flatMap((walked) => [
    ...planBareLevels(context, walked, { group: SET_UP_GROUP, id: setUpId }),
    ...planFloor(context, walked, setUpId),
    ...context.islands
      .filter(({ wallId }) => wallId === walked.wall.id)
      .flatMap((island) => planIsland(context, island, setUpId)),
    ...planCeiling(context, walked, setUpId),
  ]);
}

function planFloor(context: PlanContext, walked: WalkedWall, setUpId: string | null): AskedSlot[] {
  const standing = runsOn(context, walked).filter(({ level }) => level !== 'wall');
  if (standing.length === 0) return [];
  const lengthMm = lengthSoFar(context, walked);
  const [fromMm, toMm] = reachOf(standing, lengthMm);
  const deepest = Math.max(...standing.map(({ carcassDepthMm }) => carcassDepthMm));
  const lines = [
    { key: 'wall', words: 'at the wall', yMm: OFF_THE_WALL_MM },
    {
      key: 'kick',
      words: 'at the kick line',
      yMm: Math.max(OFF_THE_WALL_MM, deepest - context.rules.kickDepthMm),
    },
  ];
  const places = spreadPlaces(fromMm, toMm, FLOOR_SPACING_MM);
  const names = standing.map(({ name }) => name).join(' and ');
  return places.flatMap((place, i) =>
    lines.map(({ key, words, yMm }) => ({
      slot: `floor:${walked.wall.id}:x${i + 1}:${key}`,
      words: `Floor along wall ${walked.wall.name}, ${placeWords(context, place)}, ${words}`,
      why: `Finds the high point under ${names} and the height of the kick.`,
      need: i === 0 || i === places.length - 1 ? ('must' as const) : ('should' as const),
      ask: {
        kind: 'floor' as const,
        wallId: walked.wall.id,
        xMm: Math.round(place),
        yMm,
        setUpGroup: SET_UP_GROUP,
        setUpId,
      },
    })),
  );
}

/** Its own floor: four corners, and the middle of its long sides. */
function planIsland(context: PlanContext, run: Run, setUpId: string | null): AskedSlot[] {
  const { island } = run;
  if (!island) return [];
  const lengthMm = run.units.reduce((sum, { widthMm }) => sum + widthMm, 0);
  const sides = [
    { key: 'back', yMm: island.offsetMm },
    { key: 'front', yMm: island.offsetMm + run.carcassDepthMm },
  ];
  return spreadPlaces(island.alongMm, island.alongMm + lengthMm, Math.max(lengthMm / 2, 1)).flatMap(
    (place, i, places) =>
      sides.map(({ key, yMm }) => ({
        slot: `floor:${run.id}:x${i + 1}:${key}`,
        words: `Floor under ${run.name}, ${key}, ${placeWords(context, place)} of wall ${context.walk.byId.get(run.wallId)?.wall.name}, ${lengthWords(yMm, context.rules)} out`,
        why: `Gives the kick of ${run.name} all round.`,
        need: i === 0 || i === places.length - 1 ? ('must' as const) : ('should' as const),
        ask: {
          kind: 'floor' as const,
          wallId: run.wallId,
          xMm: Math.round(place),
          yMm,
          setUpGroup: SET_UP_GROUP,
          setUpId,
        },
      })),
  );
}

function planCeiling(
  context: PlanContext,
  walked: WalkedWall,
  setUpId: string | null,
): AskedSlot[] {
  const high = runsOn(context, walked).filter(
    (run) => run.level === 'tall' || run.z1Mm >= NEAR_CEILING_MM || hasTallUnit(run),
  );
  if (high.length === 0) return [];
  const lengthMm = lengthSoFar(context, walked);
  const [fromMm, toMm] = reachOf(high, lengthMm);
  const yMm = Math.max(...high.map(frontDepth));
  const isTall = high.some((run) => run.level === 'tall' || hasTallUnit(run));
  return spreadPlaces(fromMm, toMm, CEILING_SPACING_MM).map((place, i) => ({
    slot: `ceiling:${walked.wall.id}:x${i + 1}`,
    words: `Ceiling along wall ${walked.wall.name}, ${placeWords(context, place)}, at the fronts`,
    why: isTall
      ? 'Says whether a tall unit stands up, and what closes its top.'
      : 'Gives the gap over the boxes and its scribe.',
    need: isTall ? ('must' as const) : ('should' as const),
    ask: {
      kind: 'ceiling' as const,
      wallId: walked.wall.id,
      xMm: Math.round(place),
      yMm,
      setUpGroup: SET_UP_GROUP,
      setUpId,
    },
  }));
}

/** A run that holds a tall unit, whatever its level. */
export function hasTallUnit(run: Run): boolean {
  return run.units.some(({ kind }) => kind === 'tall');
}

function reachOf(runs: Run[], lengthMm: number): [number, number] {
  const extents = runs.map((run) => extentOf(run, lengthMm));
  const from = Math.min(...extents.map(([left]) => left)) + OFF_THE_WALL_MM;
  const to = Math.max(...extents.map(([, right]) => right)) - OFF_THE_WALL_MM;
  return [from, Math.max(from, to)];
}

function placeWords(context: PlanContext, xMm: number): string {
  return `${lengthWords(xMm, context.rules)} from the left`;
}
