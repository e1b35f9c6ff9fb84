import { inks } from '@/lib/export/layer-style';
import { supersededWords } from '@/lib/export/sheet-stamp';
import { marginPt, type Paper, stampPt } from './leaf';
import { linesOf, putWords, type WordLook } from './words';

const labelLook: WordLook = { sizePt: 6.5, colour: inks.graphite };
const valueLook: WordLook = { sizePt: 8, weight: 500 };
const revisionLook: WordLook = { sizePt: 26, weight: 600 };

type Cell = { label: string; value: string; share: number };

/** The title block along the foot of every page: whose, which, when, by whom, and the letter that counts. */
export function putStamps(paper: Paper): void {
  const { doc } = paper;
  const { start, count } = doc.bufferedPageRange();
  for (let index = 0; index < count; index += 1) {
    doc.switchToPage(start + index);
    putStamp(paper, { number: index + 1, count });
  }
}

function putStamp(paper: Paper, leaf: { number: number; count: number }): void {
  const { doc, sheet } = paper;
  const y = doc.page.height - marginPt - stampPt;
  const width = doc.page.width - 2 * marginPt;
  const cells = cellsOf(paper);
  const revisionPt = 96;
  const total = cells.reduce((sum, { share }) => sum + share, 0);
  doc.rect(marginPt, y, width, stampPt).lineWidth(1).undash().stroke(inks.ink);
  let x: number = marginPt;
  for (const { label, value, share } of cells) {
    const cellPt = ((width - revisionPt) * share) / total;
    putCell(doc, { label, value }, { x, y, width: cellPt });
    x += cellPt;
    doc
      .moveTo(x, y)
      .lineTo(x, y + stampPt)
      .lineWidth(0.6)
      .stroke(inks.rule);
  }
  const isOut = supersededWords(sheet) !== null;
  putWords(doc, 'revision', labelLook, { x: x + 7, y: y + 10 });
  putWords(
    doc,
    sheet.release.revision,
    { ...revisionLook, colour: isOut ? inks.chalk : inks.ink },
    { x: x + 7, y: y + 38 },
  );
  if (isOut) {
    const look = { sizePt: 7.5, weight: 600, colour: inks.chalk } as const;
    putWords(doc, 'superseded', look, { x: x + revisionPt - 7, y: y + 28, anchor: 'end' });
  }
  putWords(doc, `leaf ${leaf.number} of ${leaf.count}`, labelLook, {
    x: x + revisionPt - 7,
    y: y + 10,
    anchor: 'end',
  });
}

function putCell(
  doc: PDFKit.PDFDocument,
  { label, value }: { label: string; value: string },
  { x, y, width }: { x: number; y: number; width: number },
): void {
  putWords(doc, label, labelLook, { x: x + 7, y: y + 10 });
  const lines = linesOf(doc, value, valueLook, width - 12);
  lines.slice(0, 3).forEach((line, index) => {
    const isCut = index === 2 && lines.length > 3;
    putWords(doc, isCut ? `${line} …` : line, valueLook, { x: x + 7, y: y + 21 + index * 10.5 });
  });
}

function cellsOf({ sheet, releasedOn, printedAt }: Paper): Cell[] {
  const { release, rules } = sheet;
  const unit = rules.unit === 'in' ? 'inches' : 'millimetres';
  return [
    { label: 'Setwell shop sheet', value: sheet.shopName, share: 1 },
    {
      label: `job ${sheet.jobNumber}`,
      value: `${sheet.customerName}, ${sheet.street}`,
      share: 1.25,
    },
    { label: 'room', value: `${sheet.roomName}: ${sheet.jobTitle}`, share: 1.1 },
    { label: 'measured', value: sheet.measuredWords, share: 1.5 },
    { label: 'released', value: `${release.releasedBy}, ${releasedOn}`, share: 1.15 },
    {
      label: 'printed',
      value: `${printedAt}; ${unit}, ± is k = 2; engine ${sheet.engineVersion}`,
      share: 1.5,
    },
  ];
}
