import { type Outcome, type Problem, problem, refused } from '@/lib/problem';
import { type LengthUnit, type Mm, mm } from '@/lib/units/brands';
import { commaWithThreeDigits, outsideLimits } from '@/lib/units/doubtful-length';
import { MM_PER_INCH } from '@/lib/units/fraction-parts';
import { anyLengthLimits, type LengthKind, lengthLimits } from '@/lib/units/length-limits';
import { decimal, INCHES, NUMBER, parseInches } from '@/lib/units/parse-inches';
import { plainLengthText } from '@/lib/units/plain-length-text';

/** `bare`: no unit was typed, so the shop's was taken. */
type Parsed = { mm: number; bare: boolean } | Problem;

/** Powers of ten from each metric unit to the millimetre. */
const metricShapes: [RegExp, number][] = [
  [new RegExp(`^(${NUMBER}) ?(?:mm|millimet(?:re|er)s?)$`), 0],
  [new RegExp(`^(${NUMBER}) ?(?:cm|centimet(?:re|er)s?)$`), 1],
  [new RegExp(`^(${NUMBER}) ?(?:m|met(?:re|er)s?)$`), 3],
];
const inchMark = String.raw`"|in\.?|inch|inches`;
const feetMark = String.raw`'|ft\.?|feet|foot`;
const feetShape = new RegExp(
  `^(${NUMBER}) ?(?:${feetMark})(?: ?-? ?(${INCHES}) ?(?:${inchMark})?)?$`,
);
const inchShape = new RegExp(`^(${INCHES}) ?(${inchMark})?$`);

/** As long as the wall book keeps a typed text. */
const LONGEST_TEXT = 80;

/**
 * Reads a typed length: `34 1/2`, `34-1/2"`, `34½`, `2' 10 1/2"`, `2ft 10.5in`, `876`, `876mm`,
 * `87,6 cm`, `0.876m`, with curly or prime marks and space around.
 * Edge rule: a bare number is in the shop's unit; fractions are of an inch, 1/2 to 1/64, below 1; inches
 * beside feet are under 12; what could be read two ways is asked about, never guessed. A minus is for
 * kinds that can be negative.
 * Units: mm out, 25.4 to the inch exactly.
 * Example: `34-1/2"` → 876.3; "876" in an inch shop → asked: 876 mm or 876"?
 * Problems (all errors, value null): nothing-typed, not-a-length, fraction-not-on-a-tape,
 * fraction-not-below-one, inches-past-twelve, comma-with-three-digits, inches-or-millimetres,
 * fraction-of-a-millimetre, negative-length, zero-length, too-long.
 * Source: common practice; 1 in = 25.4 mm, NIST SP 811.
 */
export function parseLength(
  text: string,
  { unit, kind }: { unit: LengthUnit; kind?: LengthKind },
): Outcome<Mm> {
  if (text.length > LONGEST_TEXT) {
    return refused(problem('not-a-length', `That is too long. Type one length, ${example(unit)}.`));
  }
  const plain = plainLengthText(text);
  if (plain === '') return refused(problem('nothing-typed', `Type a length, ${example(unit)}.`));
  const negative = plain.startsWith('-');
  const parsed = parseSize(negative ? plain.slice(1).trimStart() : plain, unit);
  if (!('mm' in parsed)) return refused(parsed);
  const size = negative && parsed.mm > 0 ? -parsed.mm : parsed.mm;
  const limits = kind === undefined ? anyLengthLimits : lengthLimits[kind];
  const outside = outsideLimits(size, limits, parsed.bare ? unit : null, plain);
  return outside === null ? { value: mm(size), problems: [] } : refused(outside);
}

function parseSize(plain: string, unit: LengthUnit): Parsed {
  for (const [shape, tens] of metricShapes) {
    const [, number] = shape.exec(plain) ?? [];
    if (number === undefined) continue;
    // A comma is a decimal one beside metres: nobody types thousands of metres.
    const asked = tens === 3 ? null : commaWithThreeDigits(plain);
    return asked ?? { mm: decimal(number, tens), bare: false };
  }
  const asked = commaWithThreeDigits(plain);
  if (asked !== null) return asked;
  const feet = feetShape.exec(plain);
  if (feet) return parseFeet(feet);
  const inches = inchShape.exec(plain);
  if (inches) return parseInchesOrBare(inches, unit, plain);
  return problem('not-a-length', `"${plain}" is not a length. Type it ${example(unit)}.`);
}

function parseFeet([, feetText = '', inchText]: RegExpExecArray): Parsed {
  const feet = decimal(feetText, 0);
  if (inchText === undefined) return { mm: feet * 12 * MM_PER_INCH, bare: false };
  if (!/^\d+$/.test(feetText)) {
    return problem('not-a-length', `Type whole feet beside inches, such as 2' 10 1/2".`);
  }
  const inches = parseInches(inchText);
  if (typeof inches !== 'number') return inches;
  if (inches < 12) return { mm: (feet * 12 + inches) * MM_PER_INCH, bare: false };
  return problem(
    'inches-past-twelve',
    `Inches beside feet stay under 12, so not ${feetText}' ${inchText}". Type 2' 10 1/2" or 34 1/2".`,
  );
}

function parseInchesOrBare(
  [, number = '', mark]: RegExpExecArray,
  unit: LengthUnit,
  plain: string,
): Parsed {
  const inches = parseInches(number);
  if (typeof inches !== 'number') return inches;
  const fraction = number.includes('/');
  if (mark !== undefined) return { mm: inches * MM_PER_INCH, bare: false };
  if (unit === 'in') return { mm: inches * MM_PER_INCH, bare: !fraction };
  if (!fraction) return { mm: inches, bare: true };
  return problem(
    'fraction-of-a-millimetre',
    `Fractions are of an inch. Type ${plain}" or the millimetres as a decimal.`,
  );
}

function example(unit: LengthUnit): string {
  return unit === 'in' ? `such as 34 1/2, 2' 10 1/2" or 876 mm` : `such as 876, 87.6 cm or 34 1/2"`;
}
