import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import { lengthOwnPart, toolCommonPart } from '@/lib/measure/uncertainty';
import { piecesUncertainty, wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { type JudgeInput, judgedBy, type PadVerdict } from './pad-verdict';
import { isNearPlace } from './same-thing';
import { sayDifference, sayLength, sayPlusMinus } from './say-length';

/**
 * The pieces of a wall added up, and held against its whole where that was read at the same height.
 *
 * Example: 1210, 914 and 875 beside a whole of 3004: 5 mm less than the whole, over a shop's 3 mm.
 * Source: common practice (add the pieces of each wall); the limit is the shop's, `pieces-against-whole`.
 */
export function verdictOfPieces(input: JudgeInput<ReadingOf<'pieces'>>): PadVerdict {
  const { reading, tool, others, rules } = input;
  const { uOwn, uCommon } = piecesUncertainty(tool, reading.piecesMm);
  const sum = `In all ${sayLength(wholeOfPieces(reading), rules)} ${sayPlusMinus(2 * Math.hypot(uOwn, uCommon), rules)}.`;
  const whole = others.find(
    (other): other is ReadingOf<'length'> =>
      other.kind === 'length' && isSameLine(other, reading) && isNearPlace(other.yMm, 0),
  );
  if (!whole) return { kind: 'note', words: sum };
  const beside = besideEachOther(input, reading, whole);
  return { ...beside, words: `${sum} ${beside.words}` };
}

/** A length held against the pieces that were read before it, if any were; null where none were. */
export function verdictBesidePieces(input: JudgeInput<ReadingOf<'length'>>): PadVerdict | null {
  const { reading, others } = input;
  const pieces = others.find(
    (other): other is ReadingOf<'pieces'> => other.kind === 'pieces' && isSameLine(other, reading),
  );
  return pieces && isNearPlace(reading.yMm, 0) ? besideEachOther(input, pieces, reading) : null;
}

function besideEachOther(
  { tool, rules }: JudgeInput<Reading>,
  pieces: ReadingOf<'pieces'>,
  whole: ReadingOf<'length'>,
): PadVerdict {
  const { uOwn, uCommon } = piecesUncertainty(tool, pieces.piecesMm);
  const further = uCommon - toolCommonPart(tool, whole.valueMm, 2);
  const expanded = 2 * Math.hypot(uOwn, lengthOwnPart(tool), further);
  const difference = wholeOfPieces(pieces) - whole.valueMm;
  const { kind, by, serious } = judgedBy(
    rules,
    'pieces-against-whole',
    { value: difference, U: expanded },
    0,
  );
  const size = `${sayDifference(difference, rules)} ${sayPlusMinus(expanded, rules)}`;
  const way = difference > 0 ? 'more' : 'less';
  const words =
    Math.abs(difference) <= expanded
      ? 'Pieces and whole agree, within the readings.'
      : `The pieces make ${size} ${way} than the whole.`;
  if (kind !== 'over') return { kind, by, words };
  const next = serious ? ' No release until they add up.' : '';
  return { kind, by, words: `${words} Measure the pieces again.${next}` };
}

function isSameLine(
  one: { wallId: string; zMm: number },
  other: { wallId: string; zMm: number },
): boolean {
  return one.wallId === other.wallId && isNearPlace(one.zMm, other.zMm);
}
