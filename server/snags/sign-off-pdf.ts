import PDFDocument from 'pdfkit';
import type { SignedSnag, SignOffView } from '@/lib/contracts/sign-offs';
import { inks } from '@/lib/export/layer-style';
import { PEN_FIELD } from '@/lib/signing/pen-field';
import { strokePath } from '@/lib/signing/stroke-path';
import { registerFonts } from '@/server/sheets/paper/paper-fonts';
import { putParagraph, putWords } from '@/server/sheets/paper/words';
import { copyWords } from './copy-words';

export type SignOffPaper = {
  signOff: SignOffView;
  /** In the language that it was signed in. */
  signedWords: string;
  shopName: string;
  customerName: string;
  address: string;
  job: string;
  size: 'letter' | 'A4';
};

const pages = { letter: [612, 792], A4: [595.28, 841.89] } as const;
const marginPt = 56;
const note = { sizePt: 9, colour: inks.graphite };
const body = { sizePt: 10.5 };
/** The pen's field is 600 wide; on paper the signature is as wide as a hand writes it. */
const penScale = 0.42;

/** What the customer signed, as they get it: the words, the open snags, the signature, who took it. */
export function signOffPdf(paper: SignOffPaper): Promise<Uint8Array> {
  const { signOff, shopName, size } = paper;
  const words = copyWords[signOff.language];
  const doc = new PDFDocument({
    size: [...pages[size]],
    margin: 0,
    font: '',
    lang: signOff.language,
    displayTitle: true,
    info: {
      Title: `${words.title}, ${paper.job}`,
      Author: shopName,
      Creator: 'Setwell',
      Producer: 'Setwell',
      CreationDate: new Date(signOff.signedAt),
    },
  });
  registerFonts(doc);
  const done = collected(doc);
  const width = pages[size][0] - 2 * marginPt;
  let y = marginPt;
  const paragraph = (text: string, look = body, gapPt = 6) => {
    if (y > pages[size][1] - marginPt - 60) {
      doc.addPage();
      y = marginPt;
    }
    y += putParagraph(doc, text, look, { x: marginPt, y, widthPt: width }) + gapPt;
  };
  putWords(doc, words.title, { sizePt: 18, weight: 600 }, { x: marginPt, y: y + 14 });
  putWords(doc, shopName, note, { x: marginPt + width, y: y + 14, anchor: 'end' });
  y += 24;
  doc
    .moveTo(marginPt, y)
    .lineTo(marginPt + width, y)
    .lineWidth(1)
    .stroke(inks.ink);
  y += 14;
  paragraph(`${paper.customerName} · ${paper.address}`);
  paragraph(paper.job, body, 14);
  paragraph(signOff.statement, body, 14);
  paragraph(words.openSnags(signOff.snags.length), { ...body, weight: 600 } as typeof body);
  for (const snag of signOff.snags) paragraph(`•  ${snagLine(snag, signOff.language)}`, body, 4);
  y += 10;
  const heightPt = PEN_FIELD.height * penScale;
  if (y + heightPt + 60 > pages[size][1] - marginPt) {
    doc.addPage();
    y = marginPt;
  }
  doc.save().translate(marginPt, y).scale(penScale);
  doc.path(strokePath(signOff.strokes)).lineWidth(3).lineCap('round').lineJoin('round');
  doc.stroke(inks.ink).restore();
  y += heightPt;
  doc
    .moveTo(marginPt, y)
    .lineTo(marginPt + PEN_FIELD.width * penScale, y)
    .lineWidth(0.6)
    .stroke(inks.ink);
  y += 6;
  paragraph(`${signOff.name}, ${paper.signedWords}`, body, 3);
  paragraph(words.takenBy(signOff.takenBy), note, 3);
  paragraph(words.record(signOff.id, signOff.isUntouched), note, 3);
  doc.end();
  return done;
}

function snagLine(snag: SignedSnag, language: 'en' | 'es'): string {
  const words = copyWords[language];
  const due = snag.dueOn ? `, ${words.by(snag.dueOn)}` : '';
  return `${[snag.place, snag.words].filter(Boolean).join(': ')} (${words.menders[snag.mender]}${due})`;
}

function collected(doc: PDFKit.PDFDocument): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = [];
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => resolve(new Uint8Array(Buffer.concat(chunks))));
    doc.on('error', reject);
  });
}
