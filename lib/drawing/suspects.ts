import type { Reading } from '@/lib/contracts/readings';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { ProvedRoom } from '@/lib/measure/prove-room';
import type { Suspect } from '@/lib/measure/room-closure';
import { formatLength } from '@/lib/units/format-length';

/** What a suspect reading was read of, so that every drawing can mark it where it belongs. */
export type SuspectPlace =
  | { kind: 'wall'; wallId: string; zMm: number | null }
  | { kind: 'spot'; wallId: string; xMm: number; zMm: number }
  | { kind: 'corner'; cornerWallId: string }
  | { kind: 'diagonal'; fromCornerWallId: string; toCornerWallId: string };

/** "100 mm too long?" at its place. */
export type SuspectMark = { place: SuspectPlace; words: string };

type Steps = Pick<FitRules, 'unit' | 'stepMm'>;

/**
 * The suspects of a fit where they were read, most likely first; several of one wall, corner or diagonal are
 * marked once, with what the likeliest of them says.
 *
 * Edge: a reading that is not in the book, or of a kind that has no place in a drawing, is left out.
 * Example: wall C read 100 mm too long at the counter: the wall C, "100 mm too long?".
 */
export function suspectMarks(
  { wallBook, fit, rules }: { wallBook: WallBook; fit: ProvedRoom; rules: Steps },
  /** Heights of one wall are told apart in its elevation only. */
  { byHeight = false }: { byHeight?: boolean } = {},
): SuspectMark[] {
  const byId = new Map(wallBook.readings.map((reading) => [reading.id, reading]));
  const marks = new Map<string, SuspectMark>();
  for (const suspect of fit.closure.suspect?.readings ?? []) {
    const reading = suspect.readingIds.map((id) => byId.get(id)).find((found) => found);
    const place = reading ? placeOf(reading) : null;
    if (!place) continue;
    const key = keyOf(place, byHeight);
    if (!marks.has(key)) marks.set(key, { place, words: slipWords(suspect, rules) });
  }
  return [...marks.values()];
}

type Slip = Pick<Suspect['readings'][number], 'slip' | 'unit' | 'known'>;

/**
 * How a reading may have slipped: as slips of the hand are known, else as it was found.
 *
 * Example: 99.5 mm too much that match a known slip give "100 mm too long?".
 */
export function slipWords({ slip, unit, known }: Slip, rules: Steps): string {
  const isOver = slip > 0;
  if (unit === 'deg') {
    return `${known ?? `${Math.abs(slip).toFixed(1)}°`} too ${isOver ? 'open' : 'closed'}?`;
  }
  if (unit === 'mm/m') {
    return `${Math.abs(slip).toFixed(1)} mm/m too far ${isOver ? 'in' : 'out'}?`;
  }
  return `${known ?? formatLength(Math.abs(slip), rules)} too ${isOver ? 'long' : 'short'}?`;
}

function placeOf(reading: Reading): SuspectPlace | null {
  switch (reading.kind) {
    case 'length':
    case 'pieces':
      return { kind: 'wall', wallId: reading.wallId, zMm: reading.zMm };
    case 'width':
      return { kind: 'wall', wallId: reading.wallId, zMm: reading.zMm };
    case 'corner':
      return { kind: 'corner', cornerWallId: reading.cornerWallId };
    case 'diagonal': {
      const { fromCornerWallId, toCornerWallId } = reading;
      return { kind: 'diagonal', fromCornerWallId, toCornerWallId };
    }
    case 'face':
      return { kind: 'spot', wallId: reading.wallId, xMm: reading.xMm, zMm: reading.zMm };
    default:
      return null;
  }
}

function keyOf(place: SuspectPlace, byHeight: boolean): string {
  switch (place.kind) {
    case 'wall':
      return `wall ${place.wallId} ${byHeight ? place.zMm : ''}`;
    case 'spot':
      return `wall ${place.wallId} ${byHeight ? `${place.xMm} ${place.zMm}` : ''}`;
    case 'corner':
      return `corner ${place.cornerWallId}`;
    case 'diagonal':
      return `diagonal ${[place.fromCornerWallId, place.toCornerWallId].sort().join(' ')}`;
  }
}
