/** What a column sorts by. Null and undefined stand last, whichever way it is sorted. */
export type SortValue = string | number | boolean | Date | null | undefined;
export type SortOrder = { column: string; isDescending: boolean };

const byWords = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/** A new list; rows that compare equal keep the order in which they came. */
export function sortRows<Row>(
  rows: readonly Row[],
  read: (row: Row) => SortValue,
  isDescending: boolean,
): Row[] {
  const direction = isDescending ? -1 : 1;
  return [...rows].sort((left, right) => {
    const a = read(left);
    const b = read(right);
    if (a == null || b == null) return Number(a == null) - Number(b == null);
    return direction * compare(a, b);
  });
}

/** Every word typed must occur somewhere in the row's text, in any order. */
export function matchesWords(text: string, typed: string): boolean {
  const haystack = text.toLowerCase();
  return typed
    .toLowerCase()
    .split(/\s+/)
    .every((word) => haystack.includes(word));
}

function compare(a: NonNullable<SortValue>, b: NonNullable<SortValue>): number {
  if (typeof a === 'string' && typeof b === 'string') return byWords.compare(a, b);
  return Number(a) - Number(b);
}
