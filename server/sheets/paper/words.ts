import { fractionRuns } from '@/lib/export/fraction-runs';
import { inks } from '@/lib/export/layer-style';
import { fontName, partOf, printable, type Weight } from './paper-fonts';

export type WordLook = {
  sizePt: number;
  weight?: Weight;
  colour?: string;
  /** With a line through it: it stood there before. */
  isStruck?: true;
};
type Doc = PDFKit.PDFDocument;
type Run = { words: string; font: string; features: ('frac' | 'tnum')[] };

/** Lines stand this many letter heights apart. */
const leading = 1.32;

/** How wide words come out on one line. */
export function widthOf(doc: Doc, words: string, look: WordLook): number {
  return runsOf(words, look).reduce((sum, run) => sum + runWidth(doc, run, look), 0);
}

/** Words on one line, its foot at `y`; fractions set as fractions, figures as wide as one another. */
export function putWords(
  doc: Doc,
  words: string,
  look: WordLook,
  at: { x: number; y: number; anchor?: 'start' | 'middle' | 'end' },
): void {
  const { anchor = 'start' } = at;
  const back = anchor === 'start' ? 0 : widthOf(doc, words, look) * (anchor === 'end' ? 1 : 0.5);
  let x = at.x - back;
  for (const run of runsOf(words, look)) {
    const { words: letters, font, features } = run;
    doc
      .font(font)
      .fontSize(look.sizePt)
      .fillColor(look.colour ?? inks.ink);
    doc.text(letters, x, at.y, { lineBreak: false, baseline: 'alphabetic', features });
    x += runWidth(doc, run, look);
  }
  if (!look.isStruck) return;
  const middle = at.y - look.sizePt * 0.28;
  doc
    .moveTo(at.x - back, middle)
    .lineTo(x, middle)
    .lineWidth(look.sizePt * 0.09)
    .undash()
    .stroke(look.colour ?? inks.ink);
}

/** Words broken into lines that keep to a width; a word wider than that stands alone. */
export function linesOf(doc: Doc, words: string, look: WordLook, widthPt: number): string[] {
  const spacePt = widthOf(doc, ' ', look);
  const lines: string[] = [];
  let line = '';
  let linePt = 0;
  for (const word of unbroken(words)) {
    const wordPt = widthOf(doc, word, look);
    if (line !== '' && linePt + spacePt + wordPt > widthPt) {
      lines.push(line);
      line = '';
    }
    linePt = line === '' ? wordPt : linePt + spacePt + wordPt;
    line = line === '' ? word : `${line} ${word}`;
  }
  return line === '' ? lines : [...lines, line];
}

/** Words over as many lines as they need, from the top down; gives the height they took. */
export function putParagraph(
  doc: Doc,
  words: string,
  look: WordLook,
  at: { x: number; y: number; widthPt: number },
): number {
  const lines = linesOf(doc, words, look, at.widthPt);
  lines.forEach((line, index) => {
    putWords(doc, line, look, { x: at.x, y: at.y + look.sizePt * (1 + leading * index) });
  });
  return heightOf(lines.length, look);
}

export function heightOf(lineCount: number, { sizePt }: WordLook): number {
  return lineCount === 0 ? 0 : sizePt * (1 + leading * (lineCount - 1)) + sizePt * 0.3;
}

/** A figure is one word, with its fraction, its unit and its ±: no line ends within it. */
function unbroken(words: string): string[] {
  return words
    .replace(/(\d) (\d+\/\d+)/g, '$1\u00A0$2')
    .replace(/(\d) (mm\b)/g, '$1\u00A0$2')
    .replace(/ ± (?=\d)/g, ' ±\u00A0')
    .split(/[ \n]+/)
    .filter((word) => word !== '');
}

function runsOf(words: string, { weight = 400 }: WordLook): Run[] {
  const plain = printable(words).replace(/(\d)\u00A0(\d+\/\d+)/g, '$1 $2');
  return fractionRuns(plain).flatMap((run): Run[] =>
    run.isFraction
      ? [{ words: run.words, font: fontName('latin', weight), features: ['frac'] }]
      : byFont(run.words, weight),
  );
}

function byFont(words: string, weight: Weight): Run[] {
  const runs: Run[] = [];
  for (const letter of words) {
    const font = fontName(partOf(letter) ?? 'latin', weight);
    const last = runs.at(-1);
    if (last?.font === font) last.words += letter;
    else runs.push({ words: letter, font, features: [] });
  }
  // Only figures are asked to be of one width: asking is what takes the time.
  return runs.map((run) => (/\d/.test(run.words) ? { ...run, features: ['tnum'] } : run));
}

/** Widths at one point, by font and words: one word is measured once for a whole print. */
const widths = new WeakMap<Doc, Map<string, number>>();

function runWidth(doc: Doc, { words, font, features }: Run, { sizePt }: WordLook): number {
  const known = widths.get(doc) ?? new Map<string, number>();
  widths.set(doc, known);
  const key = `${font} ${words}`;
  const width = known.get(key) ?? doc.font(font).fontSize(1).widthOfString(words, { features });
  known.set(key, width);
  return width * sizePt;
}
