/** Readings of one wall, as one walks up to it: corner, lengths, face, studs, services. */
import type { Run } from '@/lib/contracts/runs';
import { planBareFaces } from '@/lib/measure/plan-bare-room';
import {
  type AskedSlot,
  extentOf,
  heightsFor,
  heightWords,
  lengthSoFar,
  lengthWords,
  type PlanContext,
  planHeight,
  reachesCorner,
  runsAgainst,
  runsOn,
  spreadPlaces,
} from '@/lib/measure/plan-context';
import { piecesInstead } from '@/lib/measure/plan-pieces';
import { cornerName, frontDepth, type WalkedWall } from '@/lib/measure/room-walk';

/** Face readings along a wall no further apart; common practice, no source. */
const FACE_SPACING_MM = 900;
/** Face readings start this far out of a corner, where a level or a rule can stand; from memory. */
const OUT_OF_CORNER_MM = 100;
/** Two places nearer than this are one. */
const SAME_PLACE_MM = 250;

/** All that is read at one wall, from its left corner on. */
export function planWall(context: PlanContext, walked: WalkedWall): AskedSlot[] {
  const own = runsOn(context, walked);
  const against = runsAgainst(context, walked);
  return [
    ...planCorner(context, walked),
    ...planLengths(context, walked, [...own, ...against.map(({ run }) => run)]),
    ...planBareFaces(context, walked, lengthSoFar(context, walked)),
    ...planFaces(context, walked, own, against),
    ...planStuds(walked, own),
    ...planServices(walked, own),
  ];
}

function planCorner(context: PlanContext, walked: WalkedWall): AskedSlot[] {
  if (!walked.before || walked.leftCornerDeg === null) return [];
  const { rules, walk } = context;
  const before = walk.byId.get(walked.before.id);
  const zMm = planHeight(rules);
  const arms = [lengthSoFar(context, walked), before ? lengthSoFar(context, before) : 0];
  const isNeeded = context.runs.some(
    (run) =>
      (run.wallId === walked.wall.id && reachesCorner(run, 'left')) ||
      (run.wallId === walked.before?.id && reachesCorner(run, 'right')),
  );
  const nominalDeg = walked.leftCornerDeg;
  const outOverMm = Math.max(
    0,
    ...context.runs
      .filter(({ wallId }) => wallId === walked.wall.id || wallId === walked.before?.id)
      .map(frontDepth),
  );
  return [
    {
      slot: `corner:${walked.wall.id}:${zMm}`,
      words: `Corner ${cornerName(walked)}, ${heightWords(zMm, rules)}`,
      why: isNeeded
        ? `Sets the filler here: 1° is ${lengthWords(outOverMm * Math.tan(Math.PI / 180), rules)} over the depth.`
        : 'Lets the room be laid out and checked.',
      need: isNeeded ? 'must' : 'should',
      ask: {
        kind: 'corner',
        cornerWallId: walked.wall.id,
        zMm,
        nominalDeg,
        legMm: legLength(Math.min(...arms), rules.unit),
        carriedPast: nominalDeg > 180,
      },
    },
  ];
}

/** As long as the walls allow, in round figures a tape shows: 36, 48, 24 in or 100 mm. */
function legLength(shorterArmMm: number, unit: 'in' | 'mm'): number {
  const roundMm = unit === 'in' ? 304.8 : 100;
  const longestMm = unit === 'in' ? 1_219.2 : 1_200;
  const fits = Math.floor((shorterArmMm * 0.95) / roundMm) * roundMm;
  return Math.max(roundMm, Math.min(longestMm, fits));
}

function planLengths(context: PlanContext, walked: WalkedWall, runs: Run[]): AskedSlot[] {
  const { rules } = context;
  const { wall } = walked;
  const heights = heightsFor(rules, runs);
  // Two more heights prove a wall that no run touches as well: they let the room find a slip.
  const asked = heights.length >= 3 ? heights : lowestThree(rules.readingHeightsMm, heights);
  const plan = planHeight(rules);
  return asked.map((zMm): AskedSlot => {
    const served = runs.filter((run) => zMm >= run.z0Mm - 160 && zMm <= run.z1Mm + 160);
    const names = [...new Set(served.map(({ name }) => name))].join(' and ');
    const length: AskedSlot = {
      slot: `length:${wall.id}:${zMm}`,
      words: `Wall ${wall.name}, length ${heightWords(zMm, rules)}`,
      why:
        names !== ''
          ? `Sets the room for ${names} ${heightWords(zMm, rules)}.`
          : zMm === plan
            ? 'Lays the room out, so that the other walls can be checked.'
            : 'A second and third height let the room prove itself.',
      need: names !== '' || zMm === plan ? 'must' : 'should',
      ask: {
        kind: 'length',
        wallId: wall.id,
        zMm,
        yMm: 0,
        nominalMm: wall.nominalLengthMm,
      },
    };
    return piecesInstead(context, walked, length) ?? length;
  });
}

function lowestThree(all: number[], chosen: number[]): number[] {
  const others = [...all].sort((a, b) => a - b).filter((height) => !chosen.includes(height));
  return [...chosen, ...others.slice(0, 3 - chosen.length)].sort((a, b) => a - b);
}

function planFaces(
  context: PlanContext,
  walked: WalkedWall,
  own: Run[],
  against: { run: Run; at: 'left' | 'right' }[],
): AskedSlot[] {
  const runs = [...own, ...against.map(({ run }) => run)];
  if (runs.length === 0) return [];
  const { rules } = context;
  const lengthMm = lengthSoFar(context, walked);
  const places = mergePlaces([
    ...against.map(({ run, at }) => {
      const depthMm = Math.min(frontDepth(run), lengthMm - OUT_OF_CORNER_MM);
      return at === 'left' ? depthMm : lengthMm - depthMm;
    }),
    ...own.flatMap((run) => {
      const [from, to] = extentOf(run, lengthMm);
      const out = Math.min(OUT_OF_CORNER_MM, (to - from) / 4);
      return spreadPlaces(from + out, to - out, FACE_SPACING_MM);
    }),
  ]);
  const setUpGroup = `face:${walked.wall.id}`;
  const last = context.byKind('face').findLast(({ wallId }) => wallId === walked.wall.id);
  const heights = heightsFor(rules, runs);
  return places.flatMap((xMm, i) =>
    heights.map((zMm) => ({
      slot: `face:${walked.wall.id}:x${i + 1}:${zMm}`,
      words: `Wall ${walked.wall.name}, gap to the line ${lengthWords(xMm, rules)} from the left, ${heightWords(zMm, rules)}`,
      why:
        own.length > 0
          ? 'Shows bulges and lean behind the cabinets: set line, back gaps, scribes.'
          : 'Shows the lean beside the filler: its taper.',
      need: 'should' as const,
      ask: {
        kind: 'face' as const,
        wallId: walked.wall.id,
        xMm,
        zMm,
        setUpKind: last?.setUpKind ?? ('laser-plane' as const),
        setUpGroup,
        setUpId: last?.setUpId ?? null,
      },
    })),
  );
}

function mergePlaces(places: number[]): number[] {
  const kept: number[] = [];
  for (const place of places) {
    if (kept.every((other) => Math.abs(other - place) >= SAME_PLACE_MM)) kept.push(place);
  }
  return kept.map((place) => Math.round(place)).sort((a, b) => a - b);
}

function planStuds(walked: WalkedWall, own: Run[]): AskedSlot[] {
  const hung = own.filter(({ level }) => level !== 'base');
  if (hung.length === 0) return [];
  const names = hung.map(({ name }) => name).join(' and ');
  return ['one', 'another'].map((which, i) => ({
    slot: `stud:${walked.wall.id}:${i + 1}`,
    words: `Wall ${walked.wall.name}, ${which} stud`,
    why: `Shows what ${names} can be fixed to; two studs give the spacing.`,
    need: 'should',
    ask: { kind: 'stud', wallId: walked.wall.id, nth: i + 1 },
  }));
}

function planServices(walked: WalkedWall, own: Run[]): AskedSlot[] {
  const hasSink = own.some((run) => run.units.some(({ kind }) => kind === 'sink'));
  if (!hasSink) return [];
  return (['water', 'waste'] as const).map((feature) => ({
    slot: `feature:${walked.wall.id}:${feature}`,
    words: `Wall ${walked.wall.name}, ${feature}`,
    why: 'The sink stands to it; a gable must clear it.',
    need: 'should',
    ask: { kind: 'feature', wallId: walked.wall.id, feature },
  }));
}
