/**
 * A drawing as plain shapes, before anybody decides whether it goes to a screen, to paper or to a file.
 * Places are in drawing units, x to the right and y down.
 */

export type Point = readonly [x: number, y: number];

/** What a shape stands for; whoever renders it gives each layer its line and its colour. */
export type Layer =
  | 'wall-body'
  | 'wall-face'
  | 'wall-surface'
  | 'opening'
  | 'name-tag'
  | 'square'
  | 'unit'
  | 'unit-front'
  | 'unit-upper'
  | 'appliance'
  | 'filler'
  | 'filler-hatch'
  | 'counter'
  | 'kick'
  | 'floor'
  | 'datum'
  | 'high-point'
  | 'low-point'
  | 'stud'
  | 'stud-predicted'
  | 'feature'
  | 'diagonal'
  | 'dimension'
  | 'diagonal-asked'
  | 'walk-as-read'
  | 'walk-gap'
  | 'error-ellipse'
  | 'held-corner'
  | 'suspect'
  | 'suspect-line'
  | 'suspect-ring'
  | 'collision'
  | 'revision-cloud'
  | 'revision-letter'
  | 'revision-struck';

/** How a text speaks: plain; strong; by the way; or in the colour of a verdict. */
export type Tone = 'plain' | 'strong' | 'quiet' | 'over' | 'close' | 'within' | 'site';

export type Shape =
  | { kind: 'line'; layer: Layer; points: readonly Point[] }
  | { kind: 'area'; layer: Layer; points: readonly Point[] }
  | { kind: 'circle'; layer: Layer; centre: Point; radius: number }
  | DrawnText
  | DrawnPart;

export type DrawnText = {
  kind: 'text';
  at: Point;
  /** Spans on one line; "1 13/16" is set as a fraction where that can be done. */
  spans: readonly { words: string; tone: Tone }[];
  anchor: 'start' | 'middle' | 'end';
  /** Clockwise about `at`. */
  turnDeg: number;
  sizePx: number;
};

/** A part that can be touched: a wall, a run. */
export type DrawnPart = {
  kind: 'part';
  part: { kind: 'wall' | 'run' | 'corner' | 'revision'; id: string };
  /** "Wall B, 113 3/8, over". */
  label: string;
  /** Where a thumb may touch it, past its thin lines; left out: its areas are large enough. */
  touch?: readonly Point[];
  shapes: readonly Shape[];
};

export type Drawing = {
  shapes: Shape[];
  bounds: Bounds;
  /** How much deviations are drawn larger than they are; 1 where nothing is. */
  exaggeration: number;
  /** Drawing units to one mm of the room, for paper and files that are to a scale. */
  pxPerMm: number;
};
export type Bounds = { left: number; top: number; width: number; height: number };

export const textSizePx = 14;
export const smallTextSizePx = 12;

export function text(
  at: Point,
  words: string,
  look: { tone?: Tone; anchor?: DrawnText['anchor']; turnDeg?: number; sizePx?: number } = {},
): DrawnText {
  const { tone = 'plain', anchor = 'middle', turnDeg = 0, sizePx = textSizePx } = look;
  return { kind: 'text', at, spans: [{ words, tone }], anchor, turnDeg, sizePx };
}

/** About how wide a text will be: tabular figures and fractions are narrower than letters. */
export function textWidthPx(spans: DrawnText['spans'], sizePx: number): number {
  const signs = spans.reduce((sum, { words }) => sum + words.length, 0);
  return signs * sizePx * 0.56;
}

/** The smallest upright box that holds all shapes, with a margin; about the origin where there are none. */
export function boundsOf(shapes: readonly Shape[], marginPx: number): Bounds {
  const points = shapes.flatMap(pointsOf);
  const xs = points.length > 0 ? points.map(([x]) => x) : [0];
  const ys = points.length > 0 ? points.map(([, y]) => y) : [0];
  const left = Math.min(...xs) - marginPx;
  const top = Math.min(...ys) - marginPx;
  return {
    left,
    top,
    width: Math.max(...xs) - left + marginPx,
    height: Math.max(...ys) - top + marginPx,
  };
}

function pointsOf(shape: Shape): Point[] {
  switch (shape.kind) {
    case 'line':
    case 'area':
      return [...shape.points];
    case 'circle': {
      const { centre, radius } = shape;
      return [
        [centre[0] - radius, centre[1] - radius],
        [centre[0] + radius, centre[1] + radius],
      ];
    }
    case 'text':
      return textCorners(shape);
    case 'part':
      return shape.shapes.flatMap(pointsOf);
  }
}

function textCorners({ at, spans, anchor, turnDeg, sizePx }: DrawnText): Point[] {
  const width = textWidthPx(spans, sizePx);
  const from = anchor === 'start' ? 0 : anchor === 'end' ? -width : -width / 2;
  const turn = (turnDeg * Math.PI) / 180;
  return [
    [from, -sizePx],
    [from + width, -sizePx],
    [from, sizePx * 0.3],
    [from + width, sizePx * 0.3],
  ].map(
    ([x = 0, y = 0]): Point => [
      at[0] + x * Math.cos(turn) - y * Math.sin(turn),
      at[1] + x * Math.sin(turn) + y * Math.cos(turn),
    ],
  );
}
