import { inks } from '@/lib/export/layer-style';
import type { Share } from '@/lib/measure/fit-figure';
import type { Area } from './leaf';
import { putMark } from './put-mark';
import { below } from './table';
import { heightOf, linesOf, putParagraph, putWords, type WordLook } from './words';

/** A heading and what stands under it, as one column of a page. */
export type Section = { title: string; meta?: string; paragraphs: Paragraph[] };
export type Paragraph = {
  words: string;
  look?: Partial<WordLook>;
  mark?: Share;
  isListed?: boolean;
};

type Doc = PDFKit.PDFDocument;

const bodyLook: WordLook = { sizePt: 7.8 };
const titleLook: WordLook = { sizePt: 9.5, weight: 600 };
const markPt = 19;
const bulletPt = 9;
const betweenPt = 2.4;
const titlePt = 18;
const afterPt = 5;

/** Smaller letters are tried before a page is turned; below this they are no longer read at arm's length. */
const shares = [1, 0.94, 0.88, 0.84] as const;

/**
 * Sections one under another, in letters as large as let all of them go into the area; where not even the
 * smallest do, what no longer goes in goes on in the area that `nextArea` gives.
 */
export function putSections(
  doc: Doc,
  sections: readonly Section[],
  area: Area,
  nextArea: () => Area,
): Area {
  const share = shares.find(
    (one) => sectionsHeight(doc, inSize(sections, one), area.width) <= area.height,
  );
  return putInSize(doc, inSize(sections, share ?? 1), area, nextArea);
}

function inSize(sections: readonly Section[], share: number): Section[] {
  return sections.map((section) => ({
    ...section,
    paragraphs: section.paragraphs.map((paragraph) => {
      const { sizePt } = { ...bodyLook, ...paragraph.look };
      return { ...paragraph, look: { ...paragraph.look, sizePt: sizePt * share } };
    }),
  }));
}

/** How high some sections come out in one column. */
function sectionsHeight(doc: Doc, sections: readonly Section[], widthPt: number): number {
  return sections
    .filter(({ paragraphs }) => paragraphs.length > 0)
    .flatMap(({ paragraphs }) => [
      titlePt + afterPt,
      ...paragraphs.map((paragraph) => heightIn(doc, paragraph, widthPt) + betweenPt),
    ])
    .reduce((sum, height) => sum + height, 0);
}

function putInSize(doc: Doc, sections: readonly Section[], area: Area, nextArea: () => Area): Area {
  let free = area;
  for (const { title, meta, paragraphs } of sections) {
    if (paragraphs.length === 0) continue;
    const first = paragraphs[0];
    if (first && 22 + heightIn(doc, first, free.width) > free.height) free = nextArea();
    free = putTitle(doc, { title, meta }, free);
    for (const paragraph of paragraphs) {
      if (heightIn(doc, paragraph, free.width) > free.height) {
        free = putTitle(doc, { title: `${title}, continued` }, nextArea());
      }
      put(doc, paragraph, free);
      free = below(free, heightIn(doc, paragraph, free.width) + betweenPt);
    }
    free = below(free, afterPt);
  }
  return free;
}

function putTitle(doc: Doc, { title, meta }: { title: string; meta?: string }, area: Area): Area {
  putWords(doc, title, titleLook, { x: area.x, y: area.y + 10 });
  if (meta) {
    const look = { sizePt: 7, colour: inks.graphite };
    putWords(doc, meta, look, { x: area.x + area.width, y: area.y + 10, anchor: 'end' });
  }
  const y = area.y + 14;
  doc
    .moveTo(area.x, y)
    .lineTo(area.x + area.width, y)
    .lineWidth(0.6)
    .undash()
    .stroke(inks.ink);
  return below(area, titlePt);
}

function put(doc: Doc, { words, look, mark, isListed }: Paragraph, area: Area): void {
  const whole = { ...bodyLook, ...look };
  const indent = mark ? markPt : isListed ? bulletPt : 0;
  if (mark) putMark(doc, mark, { x: area.x, y: area.y + whole.sizePt + 0.5, heightPt: 7.5 });
  else if (isListed) {
    doc.circle(area.x + 3, area.y + whole.sizePt * 0.68, 1.1).fill(whole.colour ?? inks.ink);
  }
  putParagraph(doc, words, whole, {
    x: area.x + indent,
    y: area.y,
    widthPt: area.width - indent,
  });
}

function heightIn(doc: Doc, { words, look, mark, isListed }: Paragraph, widthPt: number): number {
  const whole = { ...bodyLook, ...look };
  const indent = mark ? markPt : isListed ? bulletPt : 0;
  return heightOf(linesOf(doc, words, whole, widthPt - indent).length, whole);
}
