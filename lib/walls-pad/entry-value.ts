import { type Outcome, problem, refused } from '@/lib/problem';
import { formatLength } from '@/lib/units/format-length';
import type { LengthKind } from '@/lib/units/length-limits';
import { parseLength } from '@/lib/units/parse-length';
import { entryText, isEmptyEntry, type PadEntry } from './pad-entry';

/** What a field of the pad takes. */
export type EntryKind = LengthKind | 'angle';

/**
 * The value of a typed entry, mm or degrees, or in words why it cannot be one.
 *
 * Edge: an empty entry is refused as nothing-typed. An inch figure that is more likely in millimetres is
 * asked about in the pad's own words, because the pad has a key for it.
 * Problems: those of `parseLength`, and angle-out-of-range.
 */
export function entryValue(entry: PadEntry, kind: EntryKind): Outcome<number> {
  if (isEmptyEntry(entry)) return refused(problem('nothing-typed', 'Type what it reads.'));
  const text = entryText(entry);
  if (kind === 'angle' || entry.unit === 'deg') return angleOf(Number(text));
  const outcome = parseLength(text, { unit: entry.unit, kind });
  const [first] = outcome.problems;
  if (first?.code !== 'inches-or-millimetres') return outcome;
  const asMm = formatLength(Number(text), { unit: 'in', stepMm: 25.4 / 16 });
  return refused(
    problem(
      'inches-or-millimetres',
      `${text} inches is ${Math.floor(Number(text) / 12)} ft. Were it millimetres it would be ${asMm}: touch in to change the unit, or type the feet with ft.`,
    ),
  );
}

function angleOf(deg: number): Outcome<number> {
  if (deg > 0 && deg < 360) return { value: deg, problems: [] };
  return refused(problem('angle-out-of-range', 'A corner is between 0° and 360°. Read it again.'));
}
