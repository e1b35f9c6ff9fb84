import { type Problem, problem } from '@/lib/problem';

/** A kilometre: past this a figure is no reading of a room, and squares of it would lose their digits. */
const PAST_ANY_ROOM = 1e6;

/** Readings no engine can work with: not a number, past any room, or an uncertainty below 0. */
export function unreadable(reads: { id: string; values: number[]; u: number }[]): Problem[] {
  return reads.flatMap(({ id, values, u }) => {
    if (!values.every(Number.isFinite)) {
      return [
        problem('reading-not-a-number', 'This reading is not a number. Take it again.', [id]),
      ];
    }
    if (values.some((value) => Math.abs(value) > PAST_ANY_ROOM)) {
      const words = 'This reading is past the size of any room. Take it again.';
      return [problem('reading-out-of-range', words, [id])];
    }
    if (u >= 0 && u <= PAST_ANY_ROOM) return [];
    const words = 'How sure this reading is cannot be told. Check its tool.';
    return [problem('uncertainty-not-known', words, [id])];
  });
}
