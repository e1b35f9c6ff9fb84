import type { DrawnText, Point, Shape } from '@/lib/drawing/shape';
import { fractionRuns } from './fraction-runs';
import { inks, layerStyle, toneStyle } from './layer-style';
import { xmlText } from './xml-text';

/** Of what a text stands clear, so that a line behind it does not strike it through. */
const haloPx = 3.5;

/** Where a drawing goes on its sheet: every place times `scale`, then moved. */
export type Placing = { scale: number; moveX: number; moveY: number };

/** Shapes as SVG elements in the units of the sheet they are placed on; styled on the element itself. */
export function svgElements(shapes: readonly Shape[], placing: Placing): string {
  return shapes.map((shape) => element(shape, placing)).join('\n');
}

function element(shape: Shape, placing: Placing): string {
  switch (shape.kind) {
    case 'line':
      return `<polyline points="${pointList(shape.points, placing)}"${style(shape.layer, placing)}/>`;
    case 'area':
      return `<polygon points="${pointList(shape.points, placing)}"${style(shape.layer, placing)}/>`;
    case 'circle': {
      const [x, y] = placed(shape.centre, placing);
      const radius = round(shape.radius * placing.scale);
      return `<circle cx="${x}" cy="${y}" r="${radius}"${style(shape.layer, placing)}/>`;
    }
    case 'text':
      return textElement(shape, placing);
    case 'part':
      return `<g class="${shape.part.kind}"><title>${xmlText(shape.label)}</title>\n${svgElements(shape.shapes, placing)}\n</g>`;
  }
}

function style(layer: keyof typeof layerStyle, { scale }: Placing): string {
  const { fill, stroke, width, dash } = layerStyle[layer];
  const fillPart = ` fill="${fill ?? 'none'}"`;
  if (!stroke) return fillPart;
  const dashes = dash.map((length) => round(length * scale)).join(' ');
  const dashPart = dashes === '' ? '' : ` stroke-dasharray="${dashes}"`;
  return `${fillPart} stroke="${stroke}" stroke-width="${round(width * scale)}"${dashPart}`;
}

function textElement(text: DrawnText, placing: Placing): string {
  const [x, y] = placed(text.at, placing);
  const turn = text.turnDeg === 0 ? '' : ` transform="rotate(${round(text.turnDeg)} ${x} ${y})"`;
  const spans = text.spans.map(({ words, tone }) => {
    const { colour, weight } = toneStyle[tone];
    return `<tspan fill="${colour}" font-weight="${weight}">${setWords(words)}</tspan>`;
  });
  const halo = ` stroke="${inks.sheet}" stroke-width="${round(haloPx * placing.scale)}" paint-order="stroke"`;
  const size = round(text.sizePx * placing.scale);
  return `<text x="${x}" y="${y}" font-size="${size}" text-anchor="${text.anchor}"${turn}${halo} stroke-linejoin="round" xml:space="preserve">${spans.join('')}</text>`;
}

/** Words as the contents of a text, their fractions set as fractions where the font can. */
export function setWords(words: string): string {
  return fractionRuns(words)
    .map((run) =>
      run.isFraction
        ? `<tspan style="font-variant-numeric:diagonal-fractions">${run.words}</tspan>`
        : xmlText(run.words),
    )
    .join('');
}

function pointList(points: readonly Point[], placing: Placing): string {
  return points.map((point) => placed(point, placing).join(',')).join(' ');
}

function placed([x, y]: Point, { scale, moveX, moveY }: Placing): [number, number] {
  return [round(x * scale + moveX), round(y * scale + moveY)];
}

const round = (value: number) => Math.round(value * 100) / 100 || 0;
