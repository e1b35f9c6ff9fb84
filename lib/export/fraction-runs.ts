/** A piece of a line that is set in one go: plain words, or a fraction set as a fraction. */
export type WordRun = { words: string; isFraction: boolean };

const fraction = /(\d+ )?(\d+)\/(\d+)/g;
/** Between numerator and denominator it makes one sign of them where the font can (Unicode 6.2). */
const fractionSlash = '\u2044';
/** Narrower than a space: a whole number and its fraction are one number. */
const thinSpace = '\u2009';

/**
 * Words with every fraction set apart, so that whoever draws them can set it properly.
 *
 * Edge: what is no fraction of digits stays as it is; "1 : 919" and "and/or" hold none.
 * Example: `blank 2 1/2"` gives "blank 2" with a thin space, "1⁄2", and `"`.
 */
export function fractionRuns(words: string): WordRun[] {
  const runs: WordRun[] = [];
  let done = 0;
  const plain = (text: string) => {
    if (text !== '') runs.push({ words: text, isFraction: false });
  };
  for (const found of words.matchAll(fraction)) {
    const [all, whole = '', numerator, denominator] = found;
    plain(words.slice(done, found.index) + (whole ? whole.trim() + thinSpace : ''));
    runs.push({ words: `${numerator}${fractionSlash}${denominator}`, isFraction: true });
    done = found.index + all.length;
  }
  plain(words.slice(done));
  return runs;
}
