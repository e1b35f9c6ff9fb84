import { drawPlan } from '@/lib/drawing/plan';
import { inks } from '@/lib/export/layer-style';
import { drawnToScale } from '@/lib/export/paper-scale';
import { outOfTrueWords } from '@/lib/export/sheet-drawings';
import { supersededWords } from '@/lib/export/sheet-stamp';
import type { Share } from '@/lib/measure/fit-figure';
import type { RunVerdict } from '@/lib/measure/run-fit';
import { cautionsFor } from '@/lib/sheet/cautions';
import { type Paragraph, putSections, type Section } from './column';
import { type Area, newLeaf, type Paper } from './leaf';
import { putDrawing } from './put-drawing';

/** Letters of 14 units come out at about 8 pt. */
export const ptPerPx = 0.56;
export const sidePt = 232;
const betweenPt = 22;

/** The first page: the room seen from above, and what the bench must know before anything else. */
export function putPlanLeaf(paper: Paper): void {
  const { doc, sheet } = paper;
  const { unit } = sheet.rules;
  const title = `${sheet.roomName}: plan`;
  const drawingArea = { width: widthBeside(paper), height: heightOn(paper) };
  const drawn = drawnToScale((look) => drawPlan(sheet, look), { unit, ptPerPx, ...drawingArea });
  const meta = metaWords('seen from above', drawn, unit);
  const area = newLeaf(paper, { title, meta });
  putDrawing(doc, drawn.drawing, { x: area.x, y: area.y, ptPerPx: drawn.ptPerPx });
  const side = sideOf(area);
  putSections(doc, sections(paper), side, () =>
    newLeaf(paper, { title: `${title}, continued`, meta }),
  );
}
