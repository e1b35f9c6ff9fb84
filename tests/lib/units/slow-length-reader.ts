/**
 * A second reader of lengths, word by word and without one grammar for all, to hold `parseLength` to.
 * Gives millimetres, or null where it sees no plain length. Bare numbers are in `unit`.
 */
const marks: [string, string][] = [
  ['millimetres', 'mm'],
  ['millimeters', 'mm'],
  ['millimetre', 'mm'],
  ['millimeter', 'mm'],
  ['centimetres', 'cm'],
  ['centimeters', 'cm'],
  ['centimetre', 'cm'],
  ['centimeter', 'cm'],
  ['metres', 'm'],
  ['meters', 'm'],
  ['metre', 'm'],
  ['meter', 'm'],
  ['inches', '"'],
  ['inch', '"'],
  ['in.', '"'],
  ['in', '"'],
  ['"', '"'],
  ["''", '"'],
  ['feet', "'"],
  ['foot', "'"],
  ['ft.', "'"],
  ['ft', "'"],
  ["'", "'"],
  ['mm', 'mm'],
  ['cm', 'cm'],
  ['m', 'm'],
];

type Word = { text: string; spaceBefore: boolean };

export function slowLengthReader(text: string, unit: 'in' | 'mm'): number | null {
  const words = split(text.toLowerCase());
  if (words === null || words.length === 0) return null;
  let sign = 1;
  if (words[0]?.text === '-') {
    sign = -1;
    words.shift();
    if (words[0]) words[0].spaceBefore = false;
  }
  const value = sized(words, unit);
  return value === null ? null : value === 0 ? 0 : sign * value;
}

function sized(words: Word[], unit: 'in' | 'mm'): number | null {
  const feetAt = words.findIndex((word) => word.text === "'");
  if (feetAt > 0) {
    const feet = words.slice(0, feetAt);
    const rest = words.slice(feetAt + 1);
    const [only] = feet;
    if (feet.length !== 1 || !only || !isNumber(only.text)) return null;
    if (rest.length === 0) return plainNumber(only.text) * 304.8;
    if (!/^\d+$/.test(only.text)) return null;
    if (rest[0]?.text === '-') rest.shift();
    if (rest.at(-1)?.text === '"') rest.pop();
    const inches = inchesOf(rest);
    return inches === null || inches >= 12 ? null : Number(only.text) * 304.8 + inches * 25.4;
  }
  const last = words.at(-1)?.text ?? '';
  const scale = { mm: 1, cm: 10, m: 1000 }[last];
  if (scale !== undefined) {
    const [only] = words;
    if (words.length !== 2 || !only || !isNumber(only.text)) return null;
    if (scale < 1000 && /,\d{3}$/.test(only.text)) return null;
    return plainNumber(only.text) * scale;
  }
  if (last === '"') {
    const inches = inchesOf(words.slice(0, -1));
    return inches === null ? null : inches * 25.4;
  }
  const inches = inchesOf(words);
  if (inches === null) return null;
  if (unit === 'in') return inches * 25.4;
  return words.length === 1 && words[0] && isNumber(words[0].text) ? inches : null;
}

function inchesOf(words: Word[]): number | null {
  const [first, second, third] = words;
  if (!first) return null;
  if (words.length === 1)
    return isNumber(first.text) ? commaSafe(first.text) : fractionOf(first.text);
  if (!/^\d+$/.test(first.text)) return null;
  if (words.length === 2 && second?.spaceBefore) {
    const part = fractionOf(second.text);
    return part === null ? null : Number(first.text) + part;
  }
  if (
    words.length === 3 &&
    second?.text === '-' &&
    !second.spaceBefore &&
    third &&
    !third.spaceBefore
  ) {
    const part = fractionOf(third.text);
    return part === null ? null : Number(first.text) + part;
  }
  return null;
}

function fractionOf(text: string): number | null {
  const at = text.indexOf('/');
  if (at < 1) return null;
  const [over, under] = [Number(text.slice(0, at)), Number(text.slice(at + 1))];
  const onTape = [2, 4, 8, 16, 32, 64].includes(under);
  return onTape && over >= 1 && over < under ? over / under : null;
}

function commaSafe(text: string): number | null {
  return /,\d{3}$/.test(text) ? null : plainNumber(text);
}

function isNumber(text: string): boolean {
  return /^(\d+|\d*[.,]\d+)$/.test(text);
}

function plainNumber(text: string): number {
  return Number(text.replace(',', '.'));
}

function split(text: string): Word[] | null {
  const words: Word[] = [];
  let at = 0;
  let space = false;
  while (at < text.length) {
    const rest = text.slice(at);
    const blank = /^\s+/.exec(rest)?.[0];
    if (blank !== undefined) {
      space = true;
      at += blank.length;
      continue;
    }
    const number = /^[\d.,/]+/.exec(rest)?.[0];
    const mark =
      number === undefined ? marks.find(([written]) => rest.startsWith(written)) : undefined;
    const dash = rest.startsWith('-') ? '-' : undefined;
    const found = number ?? mark?.[0] ?? dash;
    if (found === undefined) return null;
    words.push({ text: number ?? mark?.[1] ?? '-', spaceBefore: space });
    space = false;
    at += found.length;
  }
  return words;
}
