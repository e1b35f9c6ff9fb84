import type { ReadingOf } from '@/lib/contracts/readings';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { walkRoom } from '@/lib/measure/room-walk';
import { SLIP_LENGTHS_MM } from '@/lib/measure/slip-lengths';
import { lengthOwnPart, lengthUncertainty } from '@/lib/measure/uncertainty';
import type { RuleBehind } from '@/lib/sheet/rule-behind';
import { type JudgeInput, judgedBy, type PadVerdict } from './pad-verdict';
import { sayDifference, sayLength, sayPlusMinus } from './say-length';
import { verdictBesidePieces } from './verdict-pieces';

/** Further from the sketch than both of these is worth a word: rough lengths are rough. */
const SKETCH_SHARE = 0.08;
const SKETCH_MM = 100;
const SAME_PLACE_MM = 1;

/**
 * A wall's length beside what is known of it: its pieces, a repeat of the same height, else the nearest other height,
 * else the sketch.
 *
 * Edge: a difference smaller than its U is "the same within the reading"; one that is over the rule and as large as a
 * known slip is asked about.
 * Example: 2414.6 at the counter, 2411.4 at the floor: 1/8" longer, within a 1/4" rule.
 * Source: agreement of repeats, the shop's; plumb, the rule set that the shop has picked.
 */
export function verdictOfLength(input: JudgeInput<ReadingOf<'length'>>): PadVerdict {
  const { reading, others } = input;
  const onWall = others.filter(
    (other): other is ReadingOf<'length'> =>
      other.kind === 'length' && other.wallId === reading.wallId && isNear(other.yMm, reading.yMm),
  );
  const besidePieces = verdictBesidePieces(input);
  if (besidePieces) return besidePieces;
  const repeats = onWall.filter((other) => isNear(other.zMm, reading.zMm));
  if (repeats.length > 0) return besideRepeats(input, repeats);
  const nearest = [...onWall].sort(
    (a, b) => Math.abs(a.zMm - reading.zMm) - Math.abs(b.zMm - reading.zMm),
  )[0];
  return nearest ? besideHeight(input, nearest) : besideSketch(input);
}

function besideRepeats(
  { reading, tool, rules }: JudgeInput<ReadingOf<'length'>>,
  repeats: ReadingOf<'length'>[],
): PadVerdict {
  const mean = repeats.reduce((sum, { valueMm }) => sum + valueMm, 0) / repeats.length;
  const apart = Math.abs(reading.valueMm - mean);
  const allowed = Math.max(rules.repeatAgreementMm, differenceU(tool));
  const by = repeatRule(allowed, allowed > rules.repeatAgreementMm, rules);
  const before = `${repeats.length > 1 ? 'the mean before' : 'the reading before'}, ${sayLength(mean, rules)}`;
  if (apart <= allowed) {
    const words = `Agrees with ${before}, to ${sayDifference(apart, rules)}.`;
    return { kind: 'within', by, words };
  }
  return {
    kind: 'over',
    by,
    words: `${sayDifference(apart, rules)} from ${before}; the shop allows ${sayLength(allowed, rules)}. Read it once more.`,
  };
}

/** The shop's own: nobody publishes how near two readings of one thing must come. */
function repeatRule(allowedMm: number, isByTool: boolean, rules: FitRules): RuleBehind {
  const allowed = sayLength(allowedMm, rules);
  return {
    short: `The shop’s own, tape tolerance: repeats within ${allowed}`,
    details: [
      { label: 'Limit', words: `two readings of one thing agree within ${allowed}` },
      {
        label: 'Source',
        words: isByTool
          ? 'What this tool can tell apart (k = 2), which is more than the shop asks for.'
          : 'Tape tolerance, 1/16 in up to 30 ft; set in Shop rules.',
      },
      { label: 'What to do', words: 'Read it once more.' },
    ],
    address: '',
  };
}

function besideHeight(
  { reading, tool, rules }: JudgeInput<ReadingOf<'length'>>,
  other: ReadingOf<'length'>,
): PadVerdict {
  const difference = reading.valueMm - other.valueMm;
  const there = `at ${sayLength(other.zMm, rules)} up`;
  const expanded = differenceU(tool);
  if (Math.abs(difference) <= expanded) {
    return { kind: 'within', words: `The same as ${there}, within the reading.` };
  }
  const spanMm = Math.abs(reading.zMm - other.zMm);
  const { kind, by } = judgedBy(rules, 'wall-plumb', { value: difference, U: expanded }, spanMm);
  const isApartUpward = difference > 0 === reading.zMm > other.zMm;
  const way = isApartUpward ? 'lean apart going up' : 'lean together going up';
  const size = `${sayDifference(difference, rules)} ${difference > 0 ? 'longer' : 'shorter'} than ${there}`;
  const misread = kind === 'over' ? misreadWords(difference, expanded) : '.';
  return {
    kind,
    by,
    words: `${size} ${sayPlusMinus(expanded, rules)}: the ends ${way}${misread}`,
  };
}

/** A lean past the rule that is just as large as a slip of the hand is more often one: it is read again here and now. */
function misreadWords(differenceMm: number, expandedMm: number): string {
  const slip = SLIP_LENGTHS_MM.find(
    ({ lengthMm }) => Math.abs(Math.abs(differenceMm) - lengthMm) <= expandedMm,
  );
  return slip ? `, or one of the two is ${slip.name} misread. Read it once more.` : '.';
}

function besideSketch({ reading, tool, book, rules }: JudgeInput<ReadingOf<'length'>>): PadVerdict {
  const expanded = 2 * lengthUncertainty(tool, reading.valueMm, 2);
  const first = `First on this wall, ${sayPlusMinus(expanded, rules)}.`;
  const drawn = walkRoom(book.room).byId.get(reading.wallId)?.wall.nominalLengthMm ?? 0;
  const difference = reading.valueMm - drawn;
  const isNearSketch = Math.abs(difference) <= Math.max(SKETCH_MM, SKETCH_SHARE * drawn);
  if (drawn === 0 || isNearSketch) return { kind: 'note', words: first };
  const off = `${sayLength(Math.abs(difference), rules)} ${difference > 0 ? 'longer' : 'shorter'}`;
  return { kind: 'note', words: `${first} ${off} than the sketch.` };
}

/** U of the difference of two readings by one tool: its own error cancels. */
function differenceU(tool: JudgeInput<ReadingOf<'length'>>['tool']): number {
  return 2 * Math.SQRT2 * lengthOwnPart(tool);
}

function isNear(a: number, b: number): boolean {
  return Math.abs(a - b) <= SAME_PLACE_MM;
}
