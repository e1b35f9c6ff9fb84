import { inks } from '@/lib/export/layer-style';
import type { SheetView } from '@/lib/contracts/rooms';
import { supersededWords } from '@/lib/export/sheet-stamp';
import { putWords } from './words';

/** What the pages of one print share. */
export type Paper = {
  doc: PDFKit.PDFDocument;
  sheet: SheetView;
  size: 'letter' | 'A4';
  /** With their year: paper lies about longer than a screen. */
  releasedOn: string;
  printedAt: string;
};

/** What is free on a page, in points from the upper left. */
export type Area = { x: number; y: number; width: number; height: number };

export const marginPt = 28;
const headPt = 30;
const bandPt = 26;
export const stampPt = 50;

/** Landscape, as drawings are: points, width by height. */
const sizes = { letter: [792, 612], A4: [841.89, 595.28] } as const;

/** A new page with its heading, and the red band where the sheet no longer holds; gives what is free. */
export function newLeaf({ doc, sheet, size }: Paper, heading: { title: string; meta: string }): Area {
  const [pageWidth, pageHeight] = sizes[size];
  doc.addPage({ size: [pageWidth, pageHeight], margin: 0 });
  const width = pageWidth - 2 * marginPt;
  const stamp = supersededWords(sheet);
  let y: number = marginPt;
  if (stamp) {
    putBand(doc, stamp, { x: marginPt, y, width }, sheet.release.revision);
    y += bandPt + 8;
  }
  putWords(doc, heading.title, { sizePt: 14, weight: 600 }, { x: marginPt, y: y + 14 });
  putWords(
    doc,
    heading.meta,
    { sizePt: 8, colour: inks.graphite },
    { x: marginPt + width, y: y + 14, anchor: 'end' },
  );
  const line = y + 20;
  doc.moveTo(marginPt, line).lineTo(marginPt + width, line).lineWidth(1).undash().stroke(inks.ink);
  const top = y + headPt;
  return { x: marginPt, y: top, width, height: pageHeight - marginPt - stampPt - 10 - top };
}

function putBand(
  doc: PDFKit.PDFDocument,
  stamp: string,
  { x, y, width }: { x: number; y: number; width: number },
  revision: string,
): void {
  doc.rect(x, y, width, bandPt).fill(inks.chalk);
  const words = `${stamp.charAt(0).toUpperCase()}${stamp.slice(1)}. Do not cut from revision ${revision}.`;
  const look = { sizePt: 13, weight: 600, colour: inks.sheet } as const;
  putWords(doc, words, look, { x: x + 10, y: y + 18 });
}
