/** Single cells of a list, as people and spreadsheets write them. */
import { isLocalDate, type LocalDate } from '@/lib/time/civil';
import type { Region } from '@/lib/time/text-locale';

/** The apostrophe that the export puts before what a spreadsheet would run (see `csvText`) is taken off again. */
export function plainCell(text: string): string {
  const trimmed = text.trim();
  return /^'[=+\-@\t\r\n＝＋－＠]/.test(trimmed) ? trimmed.slice(1) : trimmed;
}

/** Yes or no; null for anything else. Example: "Yes", "x", "1", "sí" are yes; "" and "no" are no. */
export function readYesNo(text: string): boolean | null {
  const plain = text.toLowerCase();
  if (['yes', 'y', 'x', '1', 'true', 'si', 'sí'].includes(plain)) return true;
  return ['', 'no', 'n', '0', 'false', '-'].includes(plain) ? false : null;
}

/** A number with a point or a decimal comma; null for anything else. Example: "58,31" is 58.31. */
export function readNumber(text: string): number | null {
  const plain = text.replace(/^(-?\d+),(\d+)$/, '$1.$2');
  return /^-?\d+(\.\d+)?$/.test(plain) ? Number(plain) : null;
}

/**
 * A date as the shop's region writes it, or as ISO 8601; null for anything else. Two figures of a year are
 * of this century. Example: "5/12/26" is 12 May in the US and 5 December elsewhere; "12.05.2026" is 12 May.
 */
export function readDate(text: string, region: Region): LocalDate | null {
  if (isLocalDate(text)) return text;
  const [, first, mark, second, yearText] =
    /^(\d{1,2})([./-])(\d{1,2})\2(\d{4}|\d\d)$/.exec(text) ?? [];
  if (!first || !second || !yearText) return null;
  const monthFirst = region === 'US' && mark !== '.';
  const [month, day] = monthFirst ? [first, second] : [second, first];
  const year = yearText.length === 2 ? `20${yearText}` : yearText;
  const date = `${year}-${month.padStart(2, '0')}-${day.padStart(2, '0')}`;
  return isLocalDate(date) ? date : null;
}

/** Walls as the export writes them, or by their code; null for anything else. */
export function readWalls(text: string): 'not-yet' | 'bare-studs' | 'closed' | null {
  const plain = text.toLowerCase().replace(/[\s_]+/g, '-');
  if (plain === '' || plain === 'not-yet') return 'not-yet';
  return plain === 'bare-studs' || plain === 'closed' ? plain : null;
}

/** The customer's language by its code or name; null for one that is not spoken here. */
export function readLanguage(text: string): 'en' | 'es' | null {
  const plain = text.toLowerCase();
  if (['', 'en', 'eng', 'english', 'inglés', 'ingles'].includes(plain)) return 'en';
  return ['es', 'spa', 'spanish', 'español', 'espanol'].includes(plain) ? 'es' : null;
}
