import { formatLength } from '@/lib/units/format-length';

/** A length for words that are read in inch shops and metric ones: `900 mm (35 7/16")`. */
export function bothUnits(mm: number): string {
  const inches = formatLength(mm, { unit: 'in', stepMm: 25.4 / 16 });
  return `${formatLength(mm, { unit: 'mm', stepMm: 1 })} (${inches})`;
}
