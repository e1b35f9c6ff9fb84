/**
 * Typed or pasted text in the few characters the parser knows: ' " - / digits, one kind of space.
 * Not by NFKC, which makes 34½ into 341/2.
 */

const fractionCharacters: Record<string, string> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅐': '1/7',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅑': '1/9',
  '⅒': '1/10',
  '↉': '0/3',
};

const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const lowered = '₀₁₂₃₄₅₆₇₈₉';

/**
 * Plain characters for a typed length; what it does not know stays, for the parser to refuse.
 * Edge rule: a fraction character after a digit is a fraction beside a whole number; before a digit it
 * is nonsense, and a `|` is put between so that nothing can read it as a larger denominator.
 * Example: "34½" → "34 1/2"; "2′ 10″" → `2' 10"`; "34³⁄₁₆" → "34 3/16"; "⅓2" → "1/3|2".
 */
export function plainLengthText(text: string): string {
  return text
    .replace(/\s+/g, ' ')
    .replace(/[’‘′ʹʼ‵＇´`]/g, "'")
    .replace(/[”“„″ʺ‶＂]|''/g, '"')
    .replace(/[‐‑‒–—−－]/g, '-')
    .replace(/[⁄∕／]/g, '/')
    .replace(/[０-９．，]/g, (wide) => String.fromCharCode(wide.charCodeAt(0) - 0xfee0))
    .replace(
      /([⁰¹²³⁴⁵⁶⁷⁸⁹]+)\/([₀₁₂₃₄₅₆₇₈₉]+)(?=(\d?))/g,
      (_, up: string, down: string, next: string, at: number, whole: string) =>
        beside(whole, at, next, `${ordinary(up, raised)}/${ordinary(down, lowered)}`),
    )
    .replace(/⅟(\d+)/g, (_, down: string, at: number, whole: string) =>
      beside(whole, at, '', `1/${down}`),
    )
    .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅐⅛⅜⅝⅞⅑⅒↉](?=(\d?))/g, (one, next: string, at: number, whole: string) =>
      beside(whole, at, next, fractionCharacters[one] ?? one),
    )
    .toLowerCase()
    .trim();
}

function beside(whole: string, at: number, next: string, fraction: string): string {
  const afterDigit = /\d/.test(whole[at - 1] ?? '');
  return `${afterDigit ? ' ' : ''}${fraction}${next === '' ? '' : '|'}`;
}

function ordinary(digits: string, from: string): string {
  return [...digits].map((digit) => from.indexOf(digit)).join('');
}
