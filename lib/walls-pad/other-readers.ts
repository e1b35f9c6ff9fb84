import type { Reading } from '@/lib/contracts/readings';
import type { Reader } from '@/lib/contracts/rooms';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { angleOfReading } from './angle-of-reading';
import { readingWords } from './reading-words';
import { isSameThing } from './same-thing';
import { type LengthSpeech, sayDifference } from './say-length';

/** A second person's reading of the same thing, beside the one that is looked at. */
export type OtherReader = {
  readingId: string;
  name: string;
  /** What they read: `95 1/16"`. */
  value: string;
  /** Theirs against this: `1/8" more`, or `the same`. */
  difference: string;
  /** Further apart than the shop lets two readings of one thing be. */
  isApart: boolean;
};

/** Corners that differ by less are not apart whatever the tool says, as the engine has it; from memory. */
const CORNER_AGREEMENT_DEG = 0.2;

export type ReadersInput = {
  book: WallBook;
  /** Who took which; a reading that nobody is named for was taken on this phone. */
  readers: readonly Reader[];
  /** Whose phone this is. */
  ownPersonId: string;
  rules: Pick<FitRules, 'repeatAgreementMm'>;
  speech: LengthSpeech;
};

/**
 * What other people read where this was read, each with the difference; both sets stay in the book.
 *
 * Edge: a person's own repeats are not named here, nor what was corrected or taken back.
 * Example: mine 95 1/16", Ann Field's 95 3/16": `1/8" more`, apart where the shop allows 1/16".
 */
export function otherReaders(reading: Reading, input: ReadersInput): OtherReader[] {
  const { book, readers, ownPersonId, rules, speech } = input;
  const readerOf = new Map(
    readers.flatMap((reader) => reader.readingIds.map((id) => [id, reader] as const)),
  );
  const personOf = ({ id }: Reading) => readerOf.get(id)?.personId ?? ownPersonId;
  const own = sizesOf(reading, book);
  return standingReadings(book.readings)
    .filter((other) => other.id !== reading.id && personOf(other) !== personOf(reading))
    .filter((other) => isSameThing(reading, other))
    .flatMap((other) => {
      const worst = worstOf(own, sizesOf(other, book));
      if (worst === null) return [];
      const { unit, by } = worst;
      const said = unit === 'deg' ? `${Math.abs(by).toFixed(1)}°` : sayDifference(by, speech);
      const way = by > 0 ? 'more' : 'less';
      return {
        readingId: other.id,
        name: readerOf.get(other.id)?.name ?? 'You',
        value: readingWords(other, book.room, speech).value,
        difference: by === 0 ? 'the same' : `${said} ${way}`,
        isApart: Math.abs(by) > (unit === 'deg' ? CORNER_AGREEMENT_DEG : rules.repeatAgreementMm),
      };
    });
}

type Sizes = { unit: 'mm' | 'deg'; values: number[] };

/** The figures that are held side by side, in a fixed order. */
function sizesOf(reading: Reading, { tools }: WallBook): Sizes | null {
  switch (reading.kind) {
    case 'length':
    case 'diagonal':
    case 'width':
      return { unit: 'mm', values: [reading.valueMm] };
    case 'pieces':
      return { unit: 'mm', values: [wholeOfPieces(reading)] };
    case 'corner': {
      const tool = tools.find(({ id }) => id === reading.toolId);
      const angle = tool ? angleOfReading(reading, tool).value : null;
      return angle ? { unit: 'deg', values: [angle.value] } : null;
    }
    case 'stud':
      return { unit: 'mm', values: [reading.xMm] };
    case 'doorway':
      return { unit: 'mm', values: [reading.clearWidthMm, reading.clearHeightMm] };
    case 'feature':
      return { unit: 'mm', values: [reading.x0Mm, reading.x1Mm, reading.z0Mm, reading.z1Mm] };
    default:
      return null;
  }
}

/** The figure that differs most, theirs less ours. */
function worstOf(
  own: Sizes | null,
  theirs: Sizes | null,
): { unit: 'mm' | 'deg'; by: number } | null {
  if (!own || !theirs) return null;
  const differences = theirs.values.map((value, at) => value - (own.values[at] ?? value));
  const by = differences.sort((one, other) => Math.abs(other) - Math.abs(one))[0] ?? 0;
  // Below a thousandth it is how numbers are kept, not what was read.
  return { unit: own.unit, by: Math.abs(by) < 1e-3 ? 0 : by };
}
