import type { LengthUnit } from '@/lib/units/brands';
import { entryValue } from './entry-value';
import { emptyEntry, entryOfLength, isEmptyEntry, type PadEntry } from './pad-entry';
import type { CornerMethod, PadAsk, PadField } from './pad-fields';

/** A question half answered; plain JSON, kept at every touch. */
export type PadDraft = {
  /** Which question it answers; a draft of another one is not taken up. */
  question: string;
  cornerMethod: CornerMethod;
  entries: Record<string, PadEntry>;
  /** Name of the field being typed. */
  active: string;
};

/**
 * A question not yet begun: what the question knows stands there already, and the first empty field is
 * the one to type.
 *
 * Example: a corner whose legs the plan gives as 36 begins at the diagonal.
 */
export function freshDraft(
  question: string,
  ask: PadAsk,
  fields: readonly PadField[],
  unit: LengthUnit,
  cornerMethod: CornerMethod,
): PadDraft {
  const entries: Record<string, PadEntry> = {};
  for (const { name, kind } of fields) {
    entries[name] = emptyEntry(kind === 'angle' ? 'deg' : unit);
  }
  const isByLegs = ask.kind === 'corner' && cornerMethod === 'legs' && ask.legMm > 0;
  if (isByLegs) {
    entries.legLeft = entryOfLength(ask.legMm, unit);
    entries.legRight = entryOfLength(ask.legMm, unit);
  }
  const active = fields.find(({ name }) => isEmptyEntry(entries[name] ?? emptyEntry(unit)));
  return { question, cornerMethod, entries, active: active?.name ?? '' };
}

/**
 * The field to go to when the active one is done; null when nothing more must be typed.
 *
 * Edge: an optional field is offered once, on the way past it; an empty required one always.
 * Example: width typed, height empty: height. Both typed, the optional third empty: the third, then null.
 */
export function nextField(fields: readonly PadField[], draft: PadDraft): string | null {
  const isOpen = ({ name, isOnDemand }: PadField) => {
    const entry = draft.entries[name];
    return !isOnDemand && (!entry || isEmptyEntry(entry));
  };
  const at = fields.findIndex(({ name }) => name === draft.active);
  const later = fields.slice(at + 1).find(isOpen);
  const required = fields.find((field) => isOpen(field) && !field.isOptional);
  return (later ?? required)?.name ?? null;
}

/**
 * The draft in the other unit: the figure being typed keeps its digits, because it was the unit that was
 * wrong; what stood there before keeps its length.
 */
export function draftInUnit(
  draft: PadDraft,
  fields: readonly PadField[],
  unit: LengthUnit,
): PadDraft {
  const entries = Object.fromEntries(
    Object.entries(draft.entries).map(([name, entry]) => {
      if (entry.unit === 'deg' || entry.unit === unit) return [name, entry];
      if (name === draft.active || isEmptyEntry(entry)) {
        return [name, { ...emptyEntry(unit), whole: entry.whole.split('.')[0] ?? '' }];
      }
      const kind = fields.find((field) => field.name === name)?.kind ?? 'length';
      const { value } = entryValue(entry, kind);
      return [name, value === null ? emptyEntry(unit) : entryOfLength(value, unit)];
    }),
  );
  return { ...draft, entries };
}
