import type { SureCorner } from './closure-frame';
import type { ClosureSheet } from './closure-picture';
import type { Point, Shape } from './shape';
import { moved, turned } from './vector';

const sides = 28;
/** An ellipse smaller than this is drawn as a dot of this size: it is there, and it is small. */
const leastPx = 1.5;
const heldPx = 4;

/** Where each corner lies, enlarged; the corner from which the others are seen is a small square. */
export function closureEllipses(sheet: ClosureSheet): Shape[] {
  return sheet.corners.map((corner): Shape => {
    const isHeld = corner.aMm === 0 && corner.bMm === 0;
    return isHeld
      ? { kind: 'area', layer: 'held-corner', points: square(sheet.at(corner.at)) }
      : { kind: 'area', layer: 'error-ellipse', points: ellipse(sheet, corner) };
  });
}

/** An ellipse as a closed outline, so that paper and files need no curve of their own. */
function ellipse({ at, pxPerMm, ellipseFactor }: ClosureSheet, corner: SureCorner): Point[] {
  const centre = at(corner.at);
  const long = Math.max(corner.aMm * ellipseFactor * pxPerMm, leastPx);
  const short = Math.max(corner.bMm * ellipseFactor * pxPerMm, leastPx);
  return Array.from({ length: sides }, (_, step) => {
    const angle = (step / sides) * 2 * Math.PI;
    const [x, y] = turned([long * Math.cos(angle), short * Math.sin(angle)], corner.angleDeg);
    return moved(centre, [1, 0], x, [0, 1], y);
  });
}

function square([x, y]: Point): Point[] {
  return [
    [x - heldPx, y - heldPx],
    [x + heldPx, y - heldPx],
    [x + heldPx, y + heldPx],
    [x - heldPx, y + heldPx],
  ];
}
