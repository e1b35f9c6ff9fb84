import type { Reading } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import type { LengthUnit } from '@/lib/units/brands';
import { emptyEntry, entryOfLength, type PadEntry } from './pad-entry';
import type { PadAsk } from './pad-fields';
import { isNearPlace } from './same-thing';

/** What a figure will most likely begin with, to be taken with one touch; the rest is read off the tape. */
export type SameStart = { entry: PadEntry; shown: string };

/**
 * The whole inches, or all but the last two digits of the millimetres, of the same thing read beside it: the
 * wall at another height, the corner at another height, the drop or rise before it from the same line.
 *
 * Edge: null where nothing beside it was read, where it has no whole inch, and for a reading that is taken
 * again: that one must be read afresh. The fraction is never offered, so that no reading is a copy.
 * Example: wall B read 95 1/16" at the floor: at the counter 95 is offered. 2414 mm offers 24.
 * Source: our judgement: three heights of one wall share their whole inches nine times of ten.
 */
export function sameStart(
  ask: PadAsk,
  { book, setUpId, unit }: { book: WallBook; setUpId: string | null; unit: LengthUnit },
): SameStart | null {
  const beside = besideIt(ask, standingReadings(book.readings), setUpId);
  if (beside === null) return null;
  const whole = unit === 'in' ? wholeInches(beside) : leadingDigits(beside);
  return whole === '' ? null : { entry: { ...emptyEntry(unit), whole }, shown: whole };
}

function besideIt(ask: PadAsk, standing: Reading[], setUpId: string | null): number | null {
  switch (ask.kind) {
    case 'length': {
      const near = standing.flatMap((other) =>
        other.kind === 'length' &&
        other.wallId === ask.wallId &&
        isNearPlace(other.yMm, ask.yMm) &&
        !isNearPlace(other.zMm, ask.zMm)
          ? [{ apart: Math.abs(other.zMm - ask.zMm), valueMm: other.valueMm }]
          : [],
      );
      return near.sort((one, other) => one.apart - other.apart)[0]?.valueMm ?? null;
    }
    case 'corner': {
      const same = standing.flatMap((other) =>
        other.kind === 'corner' &&
        other.cornerWallId === ask.cornerWallId &&
        other.by.method === 'legs' &&
        !isNearPlace(other.zMm, ask.zMm) &&
        Math.abs(other.by.legLeftMm - ask.legMm) < 1 &&
        Math.abs(other.by.legRightMm - ask.legMm) < 1
          ? [other.by.diagonalMm]
          : [],
      );
      return same.at(-1) ?? null;
    }
    case 'floor': {
      const drops = standing.flatMap((other) =>
        other.kind === 'floor' && other.setUpId === setUpId ? [other.dropMm] : [],
      );
      return drops.at(-1) ?? null;
    }
    case 'ceiling': {
      const rises = standing.flatMap((other) =>
        other.kind === 'ceiling' && other.setUpId === setUpId ? [other.riseMm] : [],
      );
      return rises.at(-1) ?? null;
    }
    default:
      return null;
  }
}

function wholeInches(mm: number): string {
  const { whole } = entryOfLength(mm, 'in');
  return whole === '0' ? '' : whole;
}

/** The last two digits are what the tape decides. */
function leadingDigits(mm: number): string {
  return String(Math.round(mm)).slice(0, -2);
}
