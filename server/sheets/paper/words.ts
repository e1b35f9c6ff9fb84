import { fractionRuns } from '@/lib/export/fraction-runs';
import { inks } from '@/lib/export/layer-style';
import { fontName, partOf, printable, type Weight } from './paper-fonts';

export type WordLook = { sizePt: number; weight?: Weight; colour?: string };
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
    const width = runWidth(doc, run, look);
    doc.fillColor(look.colour ?? inks.ink).text(run.words, x, at.y, {
      lineBreak: false,
      baseline: 'alphabetic',
      features: run.features,
    });
    x += width;
  }
}

/** Words broken into lines that keep to a width; a word wider than that stands alone. */
export function linesOf(doc: Doc, words: string, look: WordLook, widthPt: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of unbroken(words)) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && widthOf(doc, longer, look) > widthPt) {
      lines.push(line);
      line = word;
    } else line = longer;
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

/** A whole number and its fraction are one word: no line ends between them. */
function unbroken(words: string): string[] {
  return words
    .replace(/(\d) (\d+\/\d+)/g, '$1\u00A0$2')
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
    else runs.push({ words: letter, font, features: ['tnum'] });
  }
  return runs;
}

function runWidth(doc: Doc, { words, font, features }: Run, { sizePt }: WordLook): number {
  return doc.font(font).fontSize(sizePt).widthOfString(words, { features });
}
