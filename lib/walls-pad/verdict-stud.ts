import type { ReadingOf } from '@/lib/contracts/readings';
import type { JudgeInput, PadVerdict } from './pad-verdict';
import { sayLength } from './say-length';

/** A stud as near to its spacing as this is on it; common practice, no source. */
const ON_SPACING_MM = 10;

/** A stud beside the nearest one found: how far, and whether that is a spacing the shop knows. */
export function verdictOfStud(input: JudgeInput<ReadingOf<'stud'>>): PadVerdict {
  const { reading, others, rules } = input;
  const found = others.filter(
    (other): other is ReadingOf<'stud'> =>
      other.kind === 'stud' && other.wallId === reading.wallId && other.at === reading.at,
  );
  const distances = found.map(({ xMm }) => Math.abs(xMm - reading.xMm));
  if (distances.length === 0) return { kind: 'note', words: 'First stud on this wall.' };
  const nearest = Math.min(...distances);
  const spacing = rules.studSpacingsMm.find(
    (each) =>
      nearest > each / 2 && Math.abs(nearest - Math.round(nearest / each) * each) <= ON_SPACING_MM,
  );
  const apart = `${sayLength(nearest, rules)} from the nearest`;
  if (spacing === undefined) return { kind: 'note', words: `${apart}.` };
  return { kind: 'within', words: `${apart}: on ${sayLength(spacing, rules)} centres.` };
}
