import type { Tool } from '@/lib/contracts/wall-book';
import type { PadAsk } from './pad-fields';

type ToolKind = Tool['spec']['kind'];
/** What is being read, as far as the choice of a tool goes. */
export type ToolUse = PadAsk['kind'] | 'angle' | 'feature';

/** Best first; common practice. */
const suited: Record<ToolUse, ToolKind[]> = {
  length: ['tape', 'laser'],
  pieces: ['tape', 'laser'],
  corner: ['tape', 'laser'],
  angle: ['angle-finder'],
  face: ['level', 'laser', 'tape'],
  floor: ['tape', 'laser'],
  ceiling: ['tape', 'laser'],
  diagonal: ['laser', 'tape'],
  width: ['laser', 'tape'],
  stud: ['tape'],
  doorway: ['tape'],
  feature: ['tape', 'laser'],
};

/**
 * The shop's tools for a use, those that suit it first.
 *
 * Edge: all are offered; who has only a tape reads everything with it.
 */
export function toolsFor(tools: readonly Tool[], use: ToolUse): Tool[] {
  const rank = ({ spec }: Tool) => {
    const at = suited[use].indexOf(spec.kind);
    return at < 0 ? suited[use].length : at;
  };
  return [...tools].sort((one, other) => rank(one) - rank(other));
}

/** The tool last chosen for this use, else the best suited; null in a shop with no tools. */
export function toolInHand(
  tools: readonly Tool[],
  use: ToolUse,
  chosenId: string | undefined,
): Tool | null {
  return tools.find(({ id }) => id === chosenId) ?? toolsFor(tools, use)[0] ?? null;
}
