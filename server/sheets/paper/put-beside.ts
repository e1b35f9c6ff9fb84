import type { Drawing } from '@/lib/drawing/shape';
import { drawnToScale } from '@/lib/export/paper-scale';
import { outOfTrueWords } from '@/lib/export/sheet-drawings';
import { putSections, type Section } from './column';
import { areaOf, newLeaf, type Paper } from './leaf';
import { putDrawing } from './put-drawing';

/** Letters of 14 units come out at about 8 pt. */
const ptPerPx = 0.56;
const sidePt = 226;
const betweenPt = 20;

type Beside = {
  title: string;
  /** "seen from above". */
  view: string;
  draw: (look: { pxPerMm: number }) => Drawing;
  sections: Section[];
};

/** A page with a drawing at a usual scale, and what belongs to it in a column at its right. */
export function putBeside(paper: Paper, { title, view, draw, sections }: Beside): void {
  const { doc, sheet } = paper;
  const area = areaOf(paper);
  const { unit } = sheet.rules;
  const room = { width: area.width - sidePt - betweenPt, height: area.height };
  const drawn = drawnToScale(draw, { unit, ptPerPx, ...room });
  const meta = [
    view,
    drawn.scale?.words ?? 'to no scale',
    unit === 'in' ? 'in inches' : 'in millimetres',
    outOfTrueWords(drawn.drawing),
    'figures govern',
  ];
  newLeaf(paper, { title, meta: meta.filter(Boolean).join(' · ') });
  const { bounds } = drawn.drawing;
  putDrawing(doc, drawn.drawing, {
    x: area.x + (room.width - bounds.width * drawn.ptPerPx) / 2,
    y: area.y + (room.height - bounds.height * drawn.ptPerPx) / 2,
    ptPerPx: drawn.ptPerPx,
  });
  const side = { ...area, x: area.x + area.width - sidePt, width: sidePt };
  putSections(doc, sections, side, () =>
    newLeaf(paper, { title: `${title}, continued`, meta: '' }),
  );
}
