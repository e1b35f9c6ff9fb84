/**
 * Shapes at true size, as they go into a file that machines read: millimetres, x to the right and y UP,
 * nothing drawn larger than it is.
 */
export type TruePoint = readonly [xMm: number, yMm: number];

export const trueLayers = [
  'Walls',
  'Wall faces as read',
  'Windows and doors',
  'Services',
  'Studs',
  'Studs predicted',
  'Floor as read',
  'Ceiling as read',
  'Units',
  'Units above',
  'Fronts',
  'Fillers',
  'Counters',
  'Kicks',
  'Words',
  'Revision',
] as const;
export type TrueLayer = (typeof trueLayers)[number];

export type TrueShape =
  | { kind: 'line'; layer: TrueLayer; points: readonly TruePoint[] }
  | { kind: 'outline'; layer: TrueLayer; points: readonly TruePoint[] }
  | {
      kind: 'text';
      layer: TrueLayer;
      at: TruePoint;
      anchor: 'start' | 'middle';
      words: string;
      heightMm: number;
    };

export function trueWords(
  at: TruePoint,
  words: string,
  look: { heightMm?: number; layer?: TrueLayer; anchor?: 'start' | 'middle' } = {},
): TrueShape {
  const { heightMm = 45, layer = 'Words', anchor = 'start' } = look;
  return { kind: 'text', layer, at, anchor, words, heightMm };
}

/** The same shapes elsewhere on the sheet. */
export function shifted(shapes: readonly TrueShape[], [byX, byY]: TruePoint): TrueShape[] {
  const move = ([x, y]: TruePoint): TruePoint => [x + byX, y + byY];
  return shapes.map((shape) =>
    shape.kind === 'text'
      ? { ...shape, at: move(shape.at) }
      : { ...shape, points: shape.points.map(move) },
  );
}

/** Left, right, bottom and top of some shapes; all nought where there are none. */
export function extentOf(shapes: readonly TrueShape[]) {
  const points = shapes.flatMap((shape) => (shape.kind === 'text' ? [shape.at] : shape.points));
  if (points.length === 0) return { left: 0, right: 0, bottom: 0, top: 0 };
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return {
    left: Math.min(...xs),
    right: Math.max(...xs),
    bottom: Math.min(...ys),
    top: Math.max(...ys),
  };
}
