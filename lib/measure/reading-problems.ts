import { type Problem, problem } from '@/lib/problem';
import type { Figure } from './figure';

/** A kilometre: past this a figure is no reading of a room, and squares of it would lose their digits. */
const PAST_ANY_ROOM = 1e6;

/** What a function was given: a reading, or (id null) a size or rule that is nobody's reading. */
export type Given = { id: string | null; values: number[]; u: number };

export function givenFigure(known: Figure | null): Given {
  return { id: null, values: [known?.value ?? 0], u: known?.u ?? 0 };
}

/** Readings no engine can work with: not a number, past any room, or an uncertainty below 0. */
export function unreadable(given: Given[]): Problem[] {
  const problems: Problem[] = [];
  for (const one of given) {
    if (!isReadable(one)) problems.push(problemOf(one));
  }
  return problems;
}

function isReadable({ values, u }: Given): boolean {
  for (let i = 0; i < values.length; i++) {
    if (!(Math.abs(values[i] ?? 0) <= PAST_ANY_ROOM)) return false;
  }
  return u >= 0 && u <= PAST_ANY_ROOM;
}

function problemOf({ id, values }: Given): Problem {
  const about = id === null ? [] : [id];
  if (!values.every(Number.isFinite)) {
    return problem('reading-not-a-number', 'This reading is not a number. Take it again.', about);
  }
  if (values.some((value) => Math.abs(value) > PAST_ANY_ROOM)) {
    const words = 'This reading is past the size of any room. Take it again.';
    return problem('reading-out-of-range', words, about);
  }
  const words = 'How sure this reading is cannot be told. Check its tool.';
  return problem('uncertainty-not-known', words, about);
}
