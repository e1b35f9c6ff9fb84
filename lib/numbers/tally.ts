import type { FigureSplit } from '@/lib/contracts/numbers';

/** The middle value; of an even number, the mean of the two in the middle. Null of none. */
export function median(values: readonly number[]): number | null {
  const inOrder = [...values].sort((a, b) => a - b);
  const middle = Math.floor(inOrder.length / 2);
  const upper = inOrder[middle];
  if (upper === undefined) return null;
  if (inOrder.length % 2 === 1) return upper;
  return ((inOrder[middle - 1] ?? upper) + upper) / 2;
}

/** Sums by name, largest first; equal ones by name. */
export function splitBy<Row>(
  rows: readonly Row[],
  part: (row: Row) => { name: string; value: number; outOf?: number },
): FigureSplit[] {
  const parts = new Map<string, FigureSplit>();
  for (const row of rows) {
    const { name, value, outOf } = part(row);
    const sum = parts.get(name) ?? { name, value: 0, outOf: outOf === undefined ? null : 0 };
    parts.set(name, {
      name,
      value: sum.value + value,
      outOf: outOf === undefined ? null : (sum.outOf ?? 0) + outOf,
    });
  }
  return [...parts.values()].sort((a, b) => b.value - a.value || a.name.localeCompare(b.name));
}
