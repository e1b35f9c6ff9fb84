import type { LengthUnit } from '@/lib/units/brands';
import { fractionParts, MM_PER_INCH } from '@/lib/units/fraction-parts';

/** What the pad's big figure is in. */
export type PadUnit = LengthUnit | 'deg';
export type PadKey =
  | '0'
  | '1'
  | '2'
  | '3'
  | '4'
  | '5'
  | '6'
  | '7'
  | '8'
  | '9'
  | 'ft'
  | 'point'
  | 'sign'
  | 'back'
  | 'clear';

/** A value while the thumb types it. Plain JSON, so that it is kept half-typed on the phone. */
export type PadEntry = {
  unit: PadUnit;
  isNegative: boolean;
  /** What stood when ft was touched; null without feet. */
  feet: string | null;
  /** Digits as typed, with a point where the unit has one. */
  whole: string;
  /** The tick touched on the tape, in 64ths of an inch; 0 is none. */
  sixtyFourths: number;
};

/** Digits before and after the point that a room can need. */
const roomFor: Record<PadUnit, { before: number; after: number }> = {
  in: { before: 4, after: 0 },
  mm: { before: 5, after: 1 },
  deg: { before: 3, after: 2 },
};

export function emptyEntry(unit: PadUnit): PadEntry {
  return { unit, isNegative: false, feet: null, whole: '', sixtyFourths: 0 };
}

export function isEmptyEntry({ feet, whole, sixtyFourths }: PadEntry): boolean {
  return feet === null && whole === '' && sixtyFourths === 0;
}

/**
 * The entry after one key more.
 *
 * Edge: a key that can mean nothing here changes nothing; back takes the newest thing off, the tick
 * first, then digits, then the feet mark. Feet are only for inches.
 * Example: 9 5 gives 95"; 7 ft 1 1 gives 7' 11".
 */
export function pressKey(entry: PadEntry, key: PadKey): PadEntry {
  switch (key) {
    case 'clear':
      return emptyEntry(entry.unit);
    case 'back':
      return takeBack(entry);
    case 'sign':
      return { ...entry, isNegative: !entry.isNegative };
    case 'ft':
      return pressFeet(entry);
    case 'point':
      if (roomFor[entry.unit].after === 0 || entry.whole.includes('.')) return entry;
      return { ...entry, whole: `${entry.whole || '0'}.` };
    default:
      return pressDigit(entry, key);
  }
}

/** Touches the tape at a tick; only inches have one. */
export function pressTick(entry: PadEntry, sixtyFourths: number): PadEntry {
  const isOnTape = Number.isInteger(sixtyFourths) && sixtyFourths >= 0 && sixtyFourths < 64;
  return entry.unit === 'in' && isOnTape ? { ...entry, sixtyFourths } : entry;
}

/** As `parseLength` reads it and as the record keeps it: `95 1/16`, `7' 11 1/16"`, `2413.5`, `89.5`. */
export function entryText(entry: PadEntry): string {
  const { isNegative, feet, whole, sixtyFourths } = entry;
  const size = `${whole.replace(/\.$/, '')} ${fractionText(sixtyFourths)}`.trim();
  const sign = isNegative ? '-' : '';
  if (feet === null) return `${sign}${size}`;
  return size === '' ? `${sign}${feet}'` : `${sign}${feet}' ${size}"`;
}

/**
 * The entry that shows a known length, to be corrected or agreed to.
 *
 * Edge: to the nearest 1/64 in or 0.1 mm.
 * Example: 914.4 mm in inches is 36.
 */
export function entryOfLength(mm: number, unit: LengthUnit): PadEntry {
  if (unit === 'mm') {
    const tenths = Math.round(Math.abs(mm) * 10);
    return { ...emptyEntry('mm'), isNegative: mm < 0 && tenths > 0, whole: String(tenths / 10) };
  }
  const { negative, whole, numerator, denominator } = fractionParts(mm, MM_PER_INCH / 64);
  const sixtyFourths = (numerator * 64) / denominator;
  const shown = whole === 0 && sixtyFourths > 0 ? '' : String(whole);
  return { ...emptyEntry('in'), isNegative: negative, whole: shown, sixtyFourths };
}

/** The entry that shows a known angle, to 0.01°. */
export function entryOfAngle(deg: number): PadEntry {
  return { ...emptyEntry('deg'), whole: String(Math.round(deg * 100) / 100) };
}

function pressDigit(entry: PadEntry, digit: string): PadEntry {
  const [before = '', after] = entry.whole.split('.');
  const { before: mostBefore, after: mostAfter } = roomFor[entry.unit];
  const isFull = after === undefined ? before.length >= mostBefore : after.length >= mostAfter;
  if (isFull && entry.whole !== '0') return entry;
  return { ...entry, whole: entry.whole === '0' ? digit : entry.whole + digit };
}

function pressFeet(entry: PadEntry): PadEntry {
  if (entry.unit !== 'in' || entry.feet !== null || entry.whole === '') return entry;
  return { ...entry, feet: entry.whole, whole: '' };
}

function takeBack(entry: PadEntry): PadEntry {
  if (entry.sixtyFourths > 0) return { ...entry, sixtyFourths: 0 };
  if (entry.whole !== '') return { ...entry, whole: entry.whole.slice(0, -1) };
  if (entry.feet !== null) return { ...entry, feet: null, whole: entry.feet };
  return { ...entry, isNegative: false };
}

function fractionText(sixtyFourths: number): string {
  if (sixtyFourths === 0) return '';
  const { numerator, denominator } = fractionParts((sixtyFourths * MM_PER_INCH) / 64, 25.4 / 64);
  return `${numerator}/${denominator}`;
}
