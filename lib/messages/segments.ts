/** What a text costs: in how many messages it goes out, and which character makes it dear. */
import { gsmSeptets } from './gsm-alphabet';

export type SegmentCount = {
  encoding: 'GSM-7' | 'UCS-2';
  segments: number;
  /** Septets, or 16-bit units: what the limits count. */
  units: number;
  /** The characters that the GSM alphabet does not have, once each, with the place of the first. */
  culprits: Culprit[];
};

export type Culprit = {
  character: string;
  /** "U+2019" */
  code: string;
  /** Index in the text, in UTF-16 units. */
  at: number;
};

/** One message alone, and each of several, which carry a header (3GPP TS 23.040, 9.2.3.24.1). */
const limits = {
  'GSM-7': { alone: 160, joined: 153 },
  'UCS-2': { alone: 70, joined: 67 },
} as const;

/**
 * Counts the messages that a text takes. A character of two units is never cut in two, so it may leave one
 * unit of a message empty. An empty text takes none.
 * Example: 160 letters take 1, 161 take 2, 307 take 3; 152 letters, "€" and 152 letters take 3 of GSM-7.
 */
export function countSegments(text: string): SegmentCount {
  const characters = [...text];
  const culprits = culpritsOf(characters);
  const encoding = culprits.length === 0 ? 'GSM-7' : 'UCS-2';
  const sizes = characters.map((character) =>
    encoding === 'GSM-7' ? (gsmSeptets(character) ?? 1) : character.length,
  );
  const units = sizes.reduce((total, size) => total + size, 0);
  const { alone, joined } = limits[encoding];
  const segments = units === 0 ? 0 : units <= alone ? 1 : packed(sizes, joined);
  return { encoding, segments, units, culprits };
}

function packed(sizes: number[], room: number): number {
  let segments = 1;
  let left = room;
  for (const size of sizes) {
    if (size > left) {
      segments += 1;
      left = room;
    }
    left -= size;
  }
  return segments;
}

function culpritsOf(characters: string[]): Culprit[] {
  const found = new Map<string, Culprit>();
  let at = 0;
  for (const character of characters) {
    if (gsmSeptets(character) === null && !found.has(character)) {
      found.set(character, { character, code: codeOf(character), at });
    }
    at += character.length;
  }
  return [...found.values()];
}

function codeOf(character: string): string {
  const code = character.codePointAt(0) ?? 0;
  return `U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
}
