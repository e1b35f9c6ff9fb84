import { readFileSync } from 'node:fs';
import path from 'node:path';
import { woffToSfnt } from './woff-to-sfnt';

export type Weight = 400 | 500 | 600;
/** The font comes in parts, each with the letters of some alphabets. */
type Part = 'latin' | 'latin-ext' | 'vietnamese';

/** The letters of each part that the font really has. */
const letters: Record<Part, RegExp> = {
  latin:
    /[ -~\u00A0-\u00FF\u0131\u0152\u0153\u2009\u2013\u2014\u2018-\u201A\u201C-\u201E\u2022\u2026\u2032\u2033\u2044\u20AC\u2122\u2191\u2193\u2212]/,
  'latin-ext': /[\u0100-\u0130\u0132-\u017E\u0218-\u021B\u1E80-\u1E85\u1E9E]/,
  vietnamese: /[\u01A0\u01A1\u01AF\u01B0\u1EA0-\u1EF9]/,
};

/** Signs of the trade that the font lacks, in words. */
const inWords: Record<string, string> = {
  χ: 'chi',
  θ: 'theta',
  '√': 'root of ',
  '→': 'to',
  '≤': 'at most ',
  '≥': 'at least ',
  '≈': 'about ',
  '∞': 'no end',
  '\u202F': ' ',
  '\t': ' ',
  '\n': ' ',
};

/** The part that holds a letter; null where no part does. */
export function partOf(letter: string): Part | null {
  if (letters.latin.test(letter)) return 'latin';
  if (letters['latin-ext'].test(letter)) return 'latin-ext';
  return letters.vietnamese.test(letter) ? 'vietnamese' : null;
}

/**
 * Words in letters that can be printed: a sign in words, a letter of another alphabet as a question mark,
 * and a minus where a hyphen stands for one.
 */
export function printable(words: string): string {
  const clean = words
    .normalize('NFC')
    .replace(/\p{Cf}|[^\P{Cc}\t\n]/gu, '')
    .replace(/(^|\s)-(?=\d)/g, '$1−');
  return [...clean].map((letter) => (partOf(letter) ? letter : (inWords[letter] ?? '?'))).join('');
}

export const fontName = (part: Part, weight: Weight) => `Work Sans ${part} ${weight}`;

const files = new Map<string, Buffer>();

/** Makes the fonts known to a document; only those that are used go into it. */
export function registerFonts(doc: PDFKit.PDFDocument): void {
  for (const part of ['latin', 'latin-ext', 'vietnamese'] as const) {
    for (const weight of [400, 500, 600] as const) {
      doc.registerFont(fontName(part, weight), fontFile(part, weight));
    }
  }
}

function fontFile(part: Part, weight: Weight): Buffer {
  const name = `work-sans-${part}-${weight}-normal.woff`;
  const known = files.get(name);
  if (known) return known;
  const folder = path.join(process.cwd(), 'node_modules/@fontsource/work-sans/files');
  const file = woffToSfnt(readFileSync(path.join(/*turbopackIgnore: true*/ folder, name)));
  files.set(name, file);
  return file;
}
