import type { ReadingOf } from '@/lib/contracts/readings';
import { lengthOwnPart, lengthUncertainty } from '@/lib/measure/uncertainty';
import type { RuleBehind } from '@/lib/sheet/rule-behind';
import { expectedDiagonal } from './expected-diagonal';
import type { JudgeInput, PadVerdict } from './pad-verdict';
import { sayDifference, sayLength, sayPlusMinus } from './say-length';

/**
 * A diagonal of the room beside what walls and corners say it should be.
 *
 * Edge: until they say, it is only noted. Further off than both are sure, something was misread.
 * Example: walls and corner give 5000 ± 8; 5003 agrees, 5025 does not.
 */
export function verdictOfDiagonal(input: JudgeInput<ReadingOf<'diagonal'>>): PadVerdict {
  const { reading, others, book, tool, rules } = input;
  const expected = expectedDiagonal(
    { ...book, readings: others },
    reading.fromCornerWallId,
    reading.toCornerWallId,
  );
  if (!expected)
    return { kind: 'note', words: 'Walls and corners between will be held against it.' };
  const difference = reading.valueMm - expected.value;
  const doubt = 2 * Math.hypot(expected.u, lengthUncertainty(tool, reading.valueMm, 2));
  const said = `${sayLength(expected.value, rules)} ${sayPlusMinus(2 * expected.u, rules)}`;
  if (Math.abs(difference) <= doubt) {
    return { kind: 'within', by: closureRule, words: `Agrees: walls and corners give ${said}.` };
  }
  const off = `${sayDifference(difference, rules)} ${difference > 0 ? 'more' : 'less'}`;
  return {
    kind: 'over',
    by: closureRule,
    words: `${off} than walls and corners give, ${said}. One of them is misread: take it again.`,
  };
}

/** No limit of anybody's: what the readings themselves are sure to. */
const closureRule: RuleBehind = {
  short: 'JCGM 100 (GUM), 5.1.2 and 6.2: within both U together',
  details: [
    { label: 'Limit', words: 'what walls, corners and diagonal are sure to together, k = 2' },
    { label: 'Source', words: 'JCGM 100:2008, 5.1.2 (combined uncertainty) and 6.2 (k = 2)' },
    { label: 'What to do', words: 'Take the diagonal again, then the walls and corners between.' },
  ],
  address: 'https://www.bipm.org/en/committees/jc/jcgm/publications',
};

/** A width across the room beside the nearest other one: whether the two sides run parallel. */
export function verdictOfWidth(input: JudgeInput<ReadingOf<'width'>>): PadVerdict {
  const { reading, others, tool, rules } = input;
  const nearest = others
    .filter((other): other is ReadingOf<'width'> => other.kind === 'width')
    .filter(({ wallId, toWallId }) => wallId === reading.wallId && toWallId === reading.toWallId)
    .sort((a, b) => Math.abs(a.xMm - reading.xMm) - Math.abs(b.xMm - reading.xMm))[0];
  const sure = sayPlusMinus(2 * lengthUncertainty(tool, reading.valueMm, 2), rules);
  if (!nearest) return { kind: 'note', words: `First across, ${sure}.` };
  const difference = reading.valueMm - nearest.valueMm;
  const there = `at ${sayLength(nearest.xMm, rules)} along`;
  if (Math.abs(difference) <= 2 * Math.SQRT2 * lengthOwnPart(tool)) {
    return { kind: 'within', words: `The same as ${there}, within the reading.` };
  }
  const way = difference > 0 ? 'wider' : 'narrower';
  return { kind: 'note', words: `${sayDifference(difference, rules)} ${way} than ${there}.` };
}
