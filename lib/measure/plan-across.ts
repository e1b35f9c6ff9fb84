/** Readings across the room: diagonals that let it prove itself, widths that tie a galley. */
import { nominalPlan } from '@/lib/measure/nominal-plan';
import {
  type AskedSlot,
  heightWords,
  lengthSoFar,
  lengthWords,
  type PlanContext,
  planHeight,
} from '@/lib/measure/plan-context';
import { seesAcross } from '@/lib/measure/sight-lines';

/** The three longest find nine slips of 1 in out of ten; more add little (MEASURE 12). */
const DIAGONALS = 3;

/** Diagonals and widths, after the walls. */
export function planAcross(context: PlanContext): AskedSlot[] {
  return [...planDiagonals(context), ...planWidths(context)];
}

/** The three longest diagonals of each chain that run free through the room as drawn. */
export function planDiagonals(context: PlanContext): AskedSlot[] {
  const { walk, rules } = context;
  const chains = groupByChain(context);
  const zMm = planHeight(rules);
  const lengthOf = (wallId: string) => {
    const walked = walk.byId.get(wallId);
    return walked ? lengthSoFar(context, walked) : 0;
  };
  const slots: AskedSlot[] = [];
  for (const walls of chains) {
    const closed = walls[0]?.closed ?? false;
    const room = { chains: [{ closed, walls: walls.map(({ wall }) => wall) }] };
    const plan = nominalPlan(room, lengthOf);
    const found: { from: number; to: number; lengthMm: number }[] = [];
    for (let from = 0; from < plan.x.length; from++) {
      for (let to = from + 1; to < plan.x.length; to++) {
        if (!plan.wallAt[from] || !plan.wallAt[to]) continue;
        if (!seesAcross(plan, plan.lines, from, to)) continue;
        const dx = (plan.x[to] ?? 0) - (plan.x[from] ?? 0);
        const dy = (plan.y[to] ?? 0) - (plan.y[from] ?? 0);
        found.push({ from, to, lengthMm: Math.hypot(dx, dy) });
      }
    }
    found.sort((a, b) => b.lengthMm - a.lengthMm || a.from - b.from || a.to - b.to);
    for (const { from, to } of found.slice(0, DIAGONALS)) {
      const fromCornerWallId = plan.wallAt[from] ?? '';
      const toCornerWallId = plan.wallAt[to] ?? '';
      slots.push({
        slot: diagonalSlot(fromCornerWallId, toCornerWallId, zMm),
        words: `Diagonal, left of wall ${walk.byId.get(fromCornerWallId)?.wall.name} to left of wall ${walk.byId.get(toCornerWallId)?.wall.name}, ${heightWords(zMm, rules)}`,
        why: 'A room without a diagonal cannot be proved: a slip in a wall would not show.',
        need: 'should',
        ask: { kind: 'diagonal', fromCornerWallId, toCornerWallId, zMm },
      });
    }
  }
  return slots;
}

/** The same both ways round. */
export function diagonalSlot(fromWallId: string, toWallId: string, zMm: number): string {
  const [one, other] = [fromWallId, toWallId].sort();
  return `diagonal:${one}:${other}:${zMm}`;
}

/** Facing walls of two chains: the width near both ends of the shorter one. */
function planWidths(context: PlanContext): AskedSlot[] {
  const [first, second] = groupByChain(context);
  if (!first || !second) return [];
  const { rules } = context;
  const zMm = planHeight(rules);
  const wall =
    first.find(({ wall }) => context.runs.some((run) => run.wallId === wall.id)) ?? first[0];
  const facing =
    second.find(({ wall }) => context.runs.some((run) => run.wallId === wall.id)) ?? second[0];
  if (!wall || !facing) return [];
  const shorterMm = Math.min(lengthSoFar(context, wall), lengthSoFar(context, facing));
  return [shorterMm * 0.1, shorterMm * 0.9].map((place, i) => ({
    slot: `width:${wall.wall.id}:${facing.wall.id}:x${i + 1}`,
    words: `Width from wall ${wall.wall.name}, ${lengthWords(place, rules)} from its left, to wall ${facing.wall.name}`,
    why: 'Ties the two sides of the room together and gives the aisle.',
    need: 'must',
    ask: {
      kind: 'width',
      wallId: wall.wall.id,
      xMm: Math.round(place),
      toWallId: facing.wall.id,
      zMm,
    },
  }));
}

function groupByChain({ walk }: PlanContext) {
  const chains: (typeof walk.walls)[] = [];
  for (const walked of walk.walls) {
    const chain = chains[walked.chain] ?? [];
    chain.push(walked);
    chains[walked.chain] = chain;
  }
  return chains;
}
