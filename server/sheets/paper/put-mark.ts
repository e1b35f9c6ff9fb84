import { inks } from '@/lib/export/layer-style';
import type { Share } from '@/lib/measure/fit-figure';

/** A level's vial on 26 × 14, its bubble between the lines, on a line, or past it: it reads without colour. */
const vial =
  'M3 1.2h20a2 2 0 0 1 2 2v7.6a2 2 0 0 1-2 2H3a2 2 0 0 1-2-2V3.2a2 2 0 0 1 2-2ZM8.8 1.5v11M17.2 1.5v11';
const bubbles: Record<Share, { x: number; width: number; height: number }> = {
  within: { x: 13, width: 2.6, height: 3.2 },
  close: { x: 17.2, width: 2.6, height: 3.2 },
  over: { x: 21.4, width: 2.8, height: 5 },
};

export const shareInk: Record<Share, string> = {
  within: inks.moss,
  close: inks.ochre,
  over: inks.chalk,
};

/** The mark of a verdict, its lower left corner at a place; gives its width. */
export function putMark(
  doc: PDFKit.PDFDocument,
  share: Share,
  { x, y, heightPt }: { x: number; y: number; heightPt: number },
): number {
  const scale = heightPt / 14;
  const { x: bubbleX, width, height } = bubbles[share];
  const ink = shareInk[share];
  doc
    .save()
    .translate(x, y - heightPt)
    .scale(scale)
    .lineWidth(1.3)
    .undash();
  doc.path(vial).stroke(ink);
  doc.ellipse(bubbleX, 7, width, height);
  if (share === 'within') doc.stroke(ink);
  else doc.fillAndStroke(ink, ink);
  doc.restore();
  return 26 * scale;
}
