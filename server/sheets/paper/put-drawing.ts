import type { Drawing, DrawnText, Layer, Point, Shape } from '@/lib/drawing/shape';
import { inks, layerStyle, toneStyle } from '@/lib/export/layer-style';
import { putWords, widthOf } from './words';

type Doc = PDFKit.PDFDocument;
type Place = { x: number; y: number; ptPerPx: number };

/** A drawing on the page, the upper left corner of its bounds at a place. */
export function putDrawing(doc: Doc, drawing: Drawing, { x, y, ptPerPx }: Place): void {
  const { left, top } = drawing.bounds;
  doc.save().translate(x, y).scale(ptPerPx).translate(-left, -top).lineJoin('round');
  putShapes(doc, drawing.shapes);
  doc.restore();
}

function putShapes(doc: Doc, shapes: readonly Shape[]): void {
  for (const shape of shapes) {
    switch (shape.kind) {
      case 'line':
        putPath(doc, shape.points, shape.layer, false);
        break;
      case 'area':
        putPath(doc, shape.points, shape.layer, true);
        break;
      case 'circle':
        doc.circle(...shape.centre, shape.radius);
        paint(doc, shape.layer);
        break;
      case 'text':
        putText(doc, shape);
        break;
      case 'part':
        putShapes(doc, shape.shapes);
    }
  }
}

function putPath(doc: Doc, points: readonly Point[], layer: Layer, isClosed: boolean): void {
  const [first, ...rest] = points;
  if (!first) return;
  doc.moveTo(first[0], first[1]);
  for (const [x, y] of rest) doc.lineTo(x, y);
  if (isClosed) doc.closePath();
  paint(doc, layer);
}

function paint(doc: Doc, layer: Layer): void {
  const { fill, stroke, width, dash } = layerStyle[layer];
  doc.lineWidth(width);
  if (dash.length > 0) doc.dash(dash, {});
  else doc.undash();
  if (fill && stroke) doc.fillAndStroke(fill, stroke);
  else if (fill) doc.fill(fill);
  else if (stroke) doc.stroke(stroke);
}

/** Letters stand on a little paper of their own, so that no line strikes them through. */
function putText(doc: Doc, text: DrawnText): void {
  const { sizePx, anchor } = text;
  const spans = text.spans.map(({ words, tone }) => {
    const { colour, weight } = toneStyle[tone];
    const look = { sizePt: sizePx, weight, colour };
    return { words, look, width: widthOf(doc, words, look) };
  });
  const width = spans.reduce((sum, span) => sum + span.width, 0);
  const from = anchor === 'start' ? 0 : anchor === 'end' ? -width : -width / 2;
  doc.save().translate(text.at[0], text.at[1]).rotate(text.turnDeg);
  doc
    .rect(from - 1, -sizePx * 0.76, width + 2, sizePx * 0.9)
    .fillOpacity(0.78)
    .fill(inks.sheet)
    .fillOpacity(1);
  let x = from;
  for (const { words, look, width: spanWidth } of spans) {
    putWords(doc, words, look, { x, y: 0 });
    x += spanWidth;
  }
  doc.restore();
}
