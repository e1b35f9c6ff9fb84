import type { SheetView } from '@/lib/contracts/rooms';
import { inks } from '@/lib/export/layer-style';
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
/** In the upper margin, where a printer still prints: a sheet takes no page more for being superseded. */
const bandPt = 20;
const bandTopPt = 12;
export const stampPt = 50;

/** Landscape, as drawings are: points, width by height. */
const sizes = { letter: [792, 612], A4: [841.89, 595.28] } as const;

/** What is free on every page of a print, under its heading and over its title block. */
export function areaOf({ size }: Paper): Area {
  const [pageWidth, pageHeight] = sizes[size];
  const y = marginPt + headPt;
  const foot = pageHeight - marginPt - stampPt - 10;
  return { x: marginPt, y, width: pageWidth - 2 * marginPt, height: foot - y };
}

/** A new page with its heading, and the red band where the sheet no longer holds; gives what is free. */
export function newLeaf(paper: Paper, heading: { title: string; meta: string }): Area {
  const { doc, sheet, size } = paper;
  const area = areaOf(paper);
  doc.addPage({ size: [...sizes[size]], margin: 0 });
  const stamp = supersededWords(sheet);
  if (stamp) {
    putBand(doc, stamp, { x: marginPt, y: bandTopPt, width: area.width }, sheet.release.revision);
  }
  const foot = area.y - 16;
  putWords(doc, heading.title, { sizePt: 14, weight: 600 }, { x: area.x, y: foot });
  const metaLook = { sizePt: 8, colour: inks.graphite };
  putWords(doc, heading.meta, metaLook, { x: area.x + area.width, y: foot, anchor: 'end' });
  const line = area.y - 10;
  doc.moveTo(area.x, line).lineTo(area.x + area.width, line);
  doc.lineWidth(1).undash().stroke(inks.ink);
  return area;
}

function putBand(
  doc: PDFKit.PDFDocument,
  stamp: string,
  { x, y, width }: { x: number; y: number; width: number },
  revision: string,
): void {
  doc.rect(x, y, width, bandPt).fill(inks.chalk);
  const words = `${stamp.charAt(0).toUpperCase()}${stamp.slice(1)}. Do not cut from revision ${revision}.`;
  const look = { sizePt: 12, weight: 600, colour: inks.sheet } as const;
  putWords(doc, words, look, { x: x + 10, y: y + 14.5 });
}
