import { entryValue } from './entry-value';
import { isEmptyEntry, type PadEntry } from './pad-entry';
import type { PadAsk, PadField } from './pad-fields';
import { type LengthSpeech, sayLength } from './say-length';

/**
 * What the pieces typed so far make, for whoever asks whether one was left out; null before the first, and for other
 * questions.
 *
 * Example: 60 and 22 1/2 typed of three: `82 1/2" so far, of some 142" on the sketch.`
 */
export function piecesSoFar(
  ask: PadAsk,
  fields: readonly PadField[],
  entries: Readonly<Record<string, PadEntry | undefined>>,
  speech: LengthSpeech,
): string | null {
  if (ask.kind !== 'pieces') return null;
  const typed = fields.flatMap(({ name, kind }) => {
    const entry = entries[name];
    if (kind !== 'length' || !entry || isEmptyEntry(entry)) return [];
    return entryValue(entry, kind).value ?? [];
  });
  if (typed.length === 0) return null;
  const sum = typed.reduce((total, piece) => total + piece, 0);
  return `${sayLength(sum, speech)} so far, of some ${sayLength(ask.nominalMm, speech)} on the sketch.`;
}
