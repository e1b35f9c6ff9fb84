import type { LengthUnit } from '@/lib/units/brands';
import { formatLength } from '@/lib/units/format-length';
import { MM_PER_INCH } from '@/lib/units/fraction-parts';
import { parseLength } from '@/lib/units/parse-length';

/** What is typed is carried over no coarser than this, so that changing to and fro changes nothing. */
const finestMm: Record<LengthUnit, number> = { in: MM_PER_INCH / 64, mm: 0.1 };

/**
 * A length as typed, as it would be typed in the other unit: `34 1/2` is `876.3`.
 *
 * Edge: what is no length yet stays as it stands.
 */
export function typedIn(text: string, from: LengthUnit, to: LengthUnit): string {
  const mm = lengthOf(text, from);
  return mm === null || from === to ? text : typed(mm, to);
}

/** The same whole inches with this fraction: `34 1/2` with 6 sixteenths is `34 3/8`. */
export function withSixteenths(text: string, sixteenths: number): string {
  const mm = lengthOf(text, 'in') ?? 0;
  const whole = Math.floor(mm / MM_PER_INCH + 1e-6);
  return typed((whole + sixteenths / 16) * MM_PER_INCH, 'in');
}

/** One mark of the tape more or less; never under nought. */
export function nudgedBy(text: string, unit: LengthUnit, marks: 1 | -1): string {
  const stepMm = unit === 'in' ? MM_PER_INCH / 16 : 1;
  return typed(Math.max(0, (lengthOf(text, unit) ?? 0) + marks * stepMm), unit);
}

function lengthOf(text: string, unit: LengthUnit): number | null {
  return parseLength(text, { unit }).value;
}

function typed(mm: number, unit: LengthUnit): string {
  return formatLength(mm, { unit, stepMm: finestMm[unit] })
    .replace(/["]| mm/, '')
    .replace(/\.0$/, '');
}
