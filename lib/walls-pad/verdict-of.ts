import type { Reading } from '@/lib/contracts/readings';
import { type Problem, problem } from '@/lib/problem';
import { angleOfReading } from './angle-of-reading';
import { otherReadings, type PadVerdict, type VerdictInput } from './pad-verdict';
import { verdictOfDiagonal, verdictOfWidth } from './verdict-across';
import { verdictOfCorner } from './verdict-corner';
import { verdictOfFace } from './verdict-face';
import { verdictOfCeiling, verdictOfFloor } from './verdict-floor';
import { verdictOfLength } from './verdict-length';
import { verdictOfPieces } from './verdict-pieces';
import { verdictOfStud } from './verdict-stud';

/** What the pad says of a reading at once; null where there is nothing to say. */
export function verdictOf(reading: Reading, input: VerdictInput): PadVerdict | null {
  const tool = input.book.tools.find(({ id }) => id === reading.toolId);
  if (!tool) return null;
  const given = { ...input, tool, others: otherReadings(input.book, reading) };
  switch (reading.kind) {
    case 'length':
      return verdictOfLength({ ...given, reading });
    case 'pieces':
      return verdictOfPieces({ ...given, reading });
    case 'corner':
      return verdictOfCorner({ ...given, reading });
    case 'face':
      return verdictOfFace({ ...given, reading });
    case 'floor':
      return verdictOfFloor({ ...given, reading });
    case 'ceiling':
      return verdictOfCeiling({ ...given, reading });
    case 'diagonal':
      return verdictOfDiagonal({ ...given, reading });
    case 'width':
      return verdictOfWidth({ ...given, reading });
    case 'stud':
      return verdictOfStud({ ...given, reading });
    default:
      return null;
  }
}

/**
 * Why a reading cannot be true, in words; null when it can. What is only unlikely is left to the verdict.
 *
 * Example: legs 36 and 36 with 90 between the marks: "The diagonal is longer than both legs together."
 */
export function refusalOf(reading: Reading, { book }: VerdictInput): Problem | null {
  if (reading.kind === 'corner') {
    const tool = book.tools.find(({ id }) => id === reading.toolId);
    const { problems } = tool ? angleOfReading(reading, tool) : { problems: [] };
    return problems.find(({ severity }) => severity === 'error') ?? null;
  }
  if (reading.kind === 'feature') {
    if (reading.x1Mm <= reading.x0Mm || reading.z1Mm <= reading.z0Mm) {
      return problem('feature-without-size', 'It needs a width and a height above 0.');
    }
  }
  return null;
}
