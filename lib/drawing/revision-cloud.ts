import { type Bounds, type Point, type Shape, smallTextSizePx, text, textWidthPx } from './shape';

const puffPx = 13;
const puffDepth = 0.34;
const stepsOfPuff = 5;
const trianglePx = 17;

/**
 * A revision cloud as draughtsmen draw it round what changed: puffs outward along an upright box.
 *
 * Edge: a box however small gets at least one puff a side. The outline is closed, clockwise as seen.
 * Example: a box of 60 by 20 has five puffs along its long sides and two along its short ones.
 * Source: common practice on drawings.
 */
export function revisionCloud({ left, top, width, height }: Bounds): Point[] {
  const corners: Point[] = [
    [left, top],
    [left + width, top],
    [left + width, top + height],
    [left, top + height],
  ];
  return corners.flatMap((from, index) => puffs(from, corners[(index + 1) % 4] ?? from));
}

function puffs(from: Point, to: Point): Point[] {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const count = Math.max(1, Math.round(length / puffPx));
  const [alongX, alongY] = [(to[0] - from[0]) / count, (to[1] - from[1]) / count];
  return Array.from({ length: count }, (_, puff) =>
    Array.from({ length: stepsOfPuff }, (_, step): Point => {
      const angle = (step / stepsOfPuff) * Math.PI;
      const part = puff + (1 - Math.cos(angle)) / 2;
      // To the left of the way round, which is out of the box.
      const out = Math.sin(angle) * puffDepth;
      return [from[0] + alongX * part + alongY * out, from[1] + alongY * part - alongX * out];
    }),
  ).flat();
}

/** The cloud, the letter of the revision in its triangle, and what stood there before, struck through. */
export function revisionPart(
  bounds: Bounds,
  { revision, was }: { revision: string; was: string | null },
): Shape {
  const { left, top, width, height } = bounds;
  const [x, y]: Point = [left + width + puffPx * 0.4, top - puffPx * 0.2];
  const shapes: Shape[] = [
    { kind: 'area', layer: 'revision-cloud', points: revisionCloud(bounds) },
    {
      kind: 'area',
      layer: 'revision-letter',
      points: [
        [x, y - trianglePx * 0.62],
        [x + trianglePx * 0.62, y + trianglePx * 0.38],
        [x - trianglePx * 0.62, y + trianglePx * 0.38],
      ],
    },
    text([x, y + trianglePx * 0.28], revision, { tone: 'over', sizePx: 10 }),
    ...(was === null ? [] : struck([left + width / 2, top + height + smallTextSizePx + 3], was)),
  ];
  return {
    kind: 'part',
    part: { kind: 'revision', id: revision },
    label: `Revision ${revision}: ${was === null ? 'new' : `was ${was}`}`,
    shapes,
  };
}

function struck(at: Point, was: string): Shape[] {
  const half = textWidthPx([{ words: was, tone: 'quiet' }], smallTextSizePx) / 2 + 1;
  const y = at[1] - smallTextSizePx * 0.32;
  return [
    text(at, was, { tone: 'quiet', sizePx: smallTextSizePx }),
    {
      kind: 'line',
      layer: 'revision-struck',
      points: [
        [at[0] - half, y],
        [at[0] + half, y],
      ],
    },
  ];
}
