import type { SheetView } from '@/lib/contracts/rooms';
import { inks } from './layer-style';
import { outOfTrueWords, type SheetDrawing, sheetDrawings } from './sheet-drawings';
import { supersededWords } from './sheet-stamp';
import { setWords, svgElements } from './svg-elements';
import { xmlText } from './xml-text';

/** Letters of 14 drawing units then stand about 3 mm high at the scale of printing. */
const pxPerMm = 0.25;
const marginMm = 160;
const headMm = 520;
const titleMm = 130;
const betweenMm = 200;

type Size = { width: number; height: number };

/**
 * The drawings of a released sheet as one SVG that needs nothing beside it: plan, then elevations.
 *
 * Edge: one unit of the drawing is one mm of the room, and printed at its own size it is at 1:20 (1:24 in
 * inch shops); what is out of true is drawn larger and says so, the DXF has it as it is.
 */
export function sheetSvg(sheet: SheetView): string {
  const scale = sheet.rules.unit === 'in' ? 24 : 20;
  const drawings = sheetDrawings(sheet, { pxPerMm });
  const sizes = drawings.map(({ drawing }) => sizeOf(drawing.bounds));
  const width = Math.max(2_400, ...sizes.map((size) => size.width)) + 2 * marginMm;
  const tops = sizes.map((_, index) =>
    sizes.slice(0, index).reduce((sum, { height }) => sum + titleMm + height + betweenMm, headMm),
  );
  const height =
    sizes.reduce((sum, size) => sum + titleMm + size.height + betweenMm, headMm) + marginMm;
  const paper = (mm: number) => `${Math.round((mm / scale) * 100) / 100}mm`;
  const title = `${sheet.jobNumber} ${sheet.roomName}, revision ${sheet.release.revision}`;
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<svg xmlns="http://www.w3.org/2000/svg" version="1.1" viewBox="0 0 ${round(width)} ${round(height)}" width="${paper(width)}" height="${paper(height)}" font-family="'Work Sans', 'Helvetica Neue', Arial, sans-serif" style="font-variant-numeric:tabular-nums">`,
    `<title>${xmlText(title)}</title>`,
    `<desc>One unit is one millimetre of the room; printed at its own size, 1:${scale}.</desc>`,
    `<rect width="100%" height="100%" fill="${inks.sheet}"/>`,
    head(sheet, { title, scale }),
    ...drawings.map((one, index) => placedDrawing(one, tops[index] ?? headMm)),
    '</svg>',
    '',
  ].join('\n');
}

function head(sheet: SheetView, { title, scale }: { title: string; scale: number }): string {
  const { shopName, jobTitle, customerName, street, release } = sheet;
  const stamp = supersededWords(sheet);
  const at = (lineNumber: number) => marginMm + 30 + lineNumber * 80;
  const printed = sheet.rules.unit === 'in' ? `1:${scale}, 1/2" to the foot` : `1:${scale}`;
  return [
    words(title, { x: marginMm, y: at(0), sizeMm: 88, weight: 600, colour: inks.ink }),
    words(`${shopName} · ${jobTitle} · ${customerName}, ${street}`, { x: marginMm, y: at(1) }),
    words(`released ${release.releasedAtWords} by ${release.releasedBy} · ${printed}`, {
      x: marginMm,
      y: at(2),
    }),
    ...(stamp ? [words(stamp, { x: marginMm, y: at(3), weight: 600, colour: inks.chalk })] : []),
  ].join('\n');
}

function placedDrawing({ id, title, drawing }: SheetDrawing, topMm: number): string {
  const { left, top } = drawing.bounds;
  const scale = 1 / pxPerMm;
  const placing = {
    scale,
    moveX: marginMm - left * scale,
    moveY: topMm + titleMm - top * scale,
  };
  const note = outOfTrueWords(drawing);
  return [
    `<g id="${xmlText(id)}">`,
    words(note ? `${title} · ${note}` : title, {
      x: marginMm,
      y: topMm + 70,
      sizeMm: 64,
      weight: 600,
      colour: inks.ink,
    }),
    svgElements(drawing.shapes, placing),
    '</g>',
  ].join('\n');
}

function words(
  text: string,
  look: { x: number; y: number; sizeMm?: number; weight?: number; colour?: string },
): string {
  const { x, y, sizeMm = 52, weight = 400, colour = inks.graphite } = look;
  return `<text x="${x}" y="${round(y)}" font-size="${sizeMm}" font-weight="${weight}" fill="${colour}">${setWords(text)}</text>`;
}

function sizeOf({ width, height }: Size): Size {
  return { width: width / pxPerMm, height: height / pxPerMm };
}

const round = (value: number) => Math.round(value * 100) / 100;
