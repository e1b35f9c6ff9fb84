import PDFDocument from 'pdfkit';
import type { SheetView } from '@/lib/contracts/rooms';
import { wallsWithRuns } from '@/lib/export/sheet-drawings';
import { putCutListLeaf } from './paper/cut-list-leaf';
import type { Paper } from './paper/leaf';
import { registerFonts } from './paper/paper-fonts';
import { putPlanLeaf } from './paper/plan-leaf';
import { putProofLeaf } from './paper/proof-leaf';
import { putStamps } from './paper/put-stamp';
import { putWallLeaf } from './paper/wall-leaf';

type Print = Pick<Paper, 'size' | 'releasedOn' | 'printedAt'> & { printedOn: Date };

/** The whole shop sheet as a PDF: plan, cut list, a page for each wall with runs, proved on site. */
export function sheetPdf(sheet: SheetView, { printedOn, ...print }: Print): Promise<Uint8Array> {
  const doc = new PDFDocument({
    autoFirstPage: false,
    bufferPages: true,
    // No font of the reader's own: every letter comes from ours.
    font: '',
    lang: 'en',
    displayTitle: true,
    info: {
      Title: `${sheet.jobNumber} ${sheet.roomName}, revision ${sheet.release.revision}`,
      Author: sheet.shopName,
      Subject: 'Shop sheet',
      Creator: 'Setwell',
      Producer: 'Setwell',
      CreationDate: printedOn,
    },
  });
  registerFonts(doc);
  const paper: Paper = { doc, sheet, ...print };
  putPlanLeaf(paper);
  putCutListLeaf(paper);
  for (const wall of wallsWithRuns(sheet)) putWallLeaf(paper, wall);
  putProofLeaf(paper);
  putStamps(paper);
  return finished(doc);
}

function finished(doc: PDFKit.PDFDocument): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = [];
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => resolve(new Uint8Array(Buffer.concat(chunks))));
    doc.on('error', reject);
    doc.end();
  });
}
