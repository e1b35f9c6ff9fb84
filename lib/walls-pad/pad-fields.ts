import type { AskedReading } from '@/lib/measure/missing-reading';
import type { EntryKind } from './entry-value';
import { isEmptyEntry, type PadEntry } from './pad-entry';

/** One value that the pad asks for; most questions have one, a corner by legs has three. */
export type PadField = {
  name: string;
  label: string;
  kind: EntryKind;
  isOptional?: boolean;
  /** Typed only by who touches it: going on does not lead there. */
  isOnDemand?: boolean;
};

/** The questions that the pad asks; a feature has a screen of its own. */
export type PadAsk = Exclude<AskedReading, { kind: 'feature' }>;

/** How a corner is taken. */
export type CornerMethod = 'legs' | 'angle';

/**
 * The values of a question, in the order in which they are taken.
 *
 * Edge: a wall in pieces offers one piece more than is typed, for who had to mark it once more.
 * Example: a corner by legs asks for the left leg, the right leg, the diagonal.
 */
export function padFields(
  ask: PadAsk,
  cornerMethod: CornerMethod = 'legs',
  entries: Readonly<Record<string, PadEntry | undefined>> = {},
): PadField[] {
  switch (ask.kind) {
    case 'length':
      return [{ name: 'value', label: 'length', kind: 'length' }];
    case 'pieces':
      return pieceFields(ask.stretches, entries);
    case 'corner':
      if (cornerMethod === 'angle') return [{ name: 'angle', label: 'angle', kind: 'angle' }];
      return [
        { name: 'legLeft', label: 'left leg', kind: 'leg' },
        { name: 'legRight', label: 'right leg', kind: 'leg' },
        { name: 'diagonal', label: 'diagonal', kind: 'corner-diagonal' },
      ];
    case 'face':
      return [{ name: 'gap', label: 'gap', kind: 'gap' }];
    case 'floor':
      return [{ name: 'drop', label: 'down to the floor', kind: 'drop' }];
    case 'ceiling':
      return [{ name: 'rise', label: 'up to the ceiling', kind: 'rise' }];
    case 'diagonal':
      return [{ name: 'value', label: 'diagonal', kind: 'diagonal' }];
    case 'width':
      return [{ name: 'value', label: 'width', kind: 'width' }];
    case 'stud':
      return [{ name: 'x', label: 'from the left corner', kind: 'position' }];
    case 'doorway':
      return [
        { name: 'clearWidth', label: 'clear width', kind: 'doorway' },
        { name: 'clearHeight', label: 'clear height', kind: 'doorway' },
        { name: 'passageWidth', label: 'passage behind', kind: 'doorway', isOptional: true },
      ];
  }
}

/** More chips than these cannot be read at the width of a phone. */
const MOST_PIECES = 6;

function pieceFields(
  stretches: readonly string[],
  entries: Readonly<Record<string, PadEntry | undefined>>,
): PadField[] {
  const isTyped = (n: number) => {
    const entry = entries[pieceName(n)];
    return entry !== undefined && !isEmptyEntry(entry);
  };
  const fields = stretches.map(
    (label, i): PadField => ({ name: pieceName(i + 1), label, kind: 'length' }),
  );
  for (let n = stretches.length + 1; n <= MOST_PIECES; n++) {
    fields.push({
      name: pieceName(n),
      label: isTyped(n) ? `piece ${n}` : 'one more',
      kind: 'length',
      isOptional: true,
      isOnDemand: true,
    });
    if (!isTyped(n)) break;
  }
  return fields;
}

/** The field of the nth piece from the left. */
export const pieceName = (n: number) => `piece${n}`;
