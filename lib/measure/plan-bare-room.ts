/** What is asked of a room before a run is laid out in it: which way walls lean, how floor and ceiling lie. */
import {
  type AskedSlot,
  heightWords,
  lengthSoFar,
  lengthWords,
  type PlanContext,
} from '@/lib/measure/plan-context';
import { cornerName, type WalkedWall } from '@/lib/measure/room-walk';

/** The return of a chimney breast is too short to be leaned against; its lean comes with its neighbours'. */
const TOO_SHORT_TO_PLUMB_MM = 500;
/** Where the foot of a rule stands clear of both walls of a corner; from memory. */
const OUT_OF_CORNER_MM = 100;

/** Nobody has laid out a run yet: the list stays short, and grows when one is. */
export function isBare({ runs, islands }: PlanContext): boolean {
  return runs.length + islands.length === 0;
}

/** One plumb column in the middle of each wall, low and high. */
export function planBareFaces(context: PlanContext, { wall }: WalkedWall, lengthMm: number) {
  if (!isBare(context) || lengthMm < TOO_SHORT_TO_PLUMB_MM) return [];
  const { rules } = context;
  const last = context.byKind('face').findLast(({ wallId }) => wallId === wall.id);
  // A round figure that a tape shows, near enough to the middle.
  const roundMm = rules.unit === 'in' ? 50.8 : 50;
  const xMm = Math.round(lengthMm / 2 / roundMm) * roundMm;
  const heights = [Math.min(...rules.readingHeightsMm), Math.max(...rules.readingHeightsMm)];
  return [...new Set(heights)].map(
    (zMm): AskedSlot => ({
      slot: `face:${wall.id}:plumb:${zMm}`,
      words: `Wall ${wall.name}, gap to the level ${lengthWords(xMm, rules)} from the left, ${heightWords(zMm, rules)}`,
      why: 'Shows which way the wall leans, whatever will stand against it.',
      need: 'should',
      ask: {
        kind: 'face',
        wallId: wall.id,
        xMm,
        zMm,
        setUpKind: last?.setUpKind ?? 'plumb-level',
        setUpGroup: `face:${wall.id}`,
        setUpId: last?.setUpId ?? null,
      },
    }),
  );
}

/** Floor and ceiling in each corner: where the floor is highest, and how much height there is. */
export function planBareLevels(
  context: PlanContext,
  walked: WalkedWall,
  setUp: { group: string; id: string | null },
): AskedSlot[] {
  if (!isBare(context)) return [];
  const at = walked.before ? `in corner ${cornerName(walked)}` : `left of wall ${walked.wall.name}`;
  const outMm = Math.min(OUT_OF_CORNER_MM, lengthSoFar(context, walked) / 2);
  const asked = [
    { kind: 'floor', words: 'Floor', why: 'Finds the high point, and how far the floor falls.' },
    { kind: 'ceiling', words: 'Ceiling', why: 'Says what height there is, and how it runs.' },
  ] as const;
  return asked.map(({ kind, words, why }) => ({
    slot: `${kind}:${walked.wall.id}:corner`,
    words: `${words} ${at}`,
    why,
    need: 'should',
    ask: {
      kind,
      wallId: walked.wall.id,
      xMm: Math.round(outMm),
      yMm: OUT_OF_CORNER_MM,
      setUpGroup: setUp.group,
      setUpId: setUp.id,
    },
  }));
}
