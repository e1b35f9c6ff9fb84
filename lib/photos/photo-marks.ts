/** Marks on a photo: plain data in fractions of the picture's sides, so that they hold at every size. */

/** From the left and from the top, each 0 to 1. */
export type PhotoPoint = { x: number; y: number };
export type PhotoMark =
  | { kind: 'circle'; at: PhotoPoint /** Of the longer side. */; radius: number }
  | { kind: 'arrow'; from: PhotoPoint; to: PhotoPoint }
  | { kind: 'words'; at: PhotoPoint; words: string };

export type PhotoSize = { widthPx: number; heightPx: number };

/** A circle that was only touched, not drawn out. */
const TOUCHED_RADIUS = 0.06;
/** An arrow that was only touched comes from the lower left. */
const TOUCHED_ARROW = { x: -0.12, y: 0.12 };
/** A finger wanders this far without meaning to. */
const TOUCH_SLACK = 0.02;

/**
 * The mark that a finger made from where it came down to where it went up; a touch gives one of the usual
 * size, so that nobody has to draw.
 * Example: circle, from (0.5, 0.5) to (0.6, 0.5) on a picture twice as wide as high: radius 0.1.
 */
export function markOf(
  kind: 'circle' | 'arrow',
  { from, to }: { from: PhotoPoint; to: PhotoPoint },
  size: PhotoSize,
): PhotoMark {
  const span = distance(from, to, size);
  const isTouch = span < TOUCH_SLACK;
  if (kind === 'circle') {
    return { kind, at: inside(from), radius: isTouch ? TOUCHED_RADIUS : span };
  }
  return isTouch
    ? {
        kind,
        from: inside({ x: to.x + TOUCHED_ARROW.x, y: to.y + TOUCHED_ARROW.y }),
        to: inside(to),
      }
    : { kind, from: inside(from), to: inside(to) };
}

/** Between two points, as a fraction of the longer side. */
function distance(one: PhotoPoint, other: PhotoPoint, { widthPx, heightPx }: PhotoSize): number {
  const longer = Math.max(widthPx, heightPx, 1);
  return Math.hypot((one.x - other.x) * widthPx, (one.y - other.y) * heightPx) / longer;
}

function inside({ x, y }: PhotoPoint): PhotoPoint {
  const held = (value: number) => Math.min(1, Math.max(0, value));
  return { x: held(x), y: held(y) };
}

/**
 * The line of a mark in points of the picture, in the path language that both SVG and canvas read.
 * Edge: words have no line.
 */
export function markPath(mark: PhotoMark, size: PhotoSize): string {
  const place = ({ x, y }: PhotoPoint) => ({ x: x * size.widthPx, y: y * size.heightPx });
  const longer = Math.max(size.widthPx, size.heightPx);
  if (mark.kind === 'circle') {
    const { x, y } = place(mark.at);
    const radius = mark.radius * longer;
    const half = (to: number) =>
      `A${whole(radius)} ${whole(radius)} 0 1 0 ${whole(to)} ${whole(y)}`;
    return `M${whole(x - radius)} ${whole(y)}${half(x + radius)}${half(x - radius)}Z`;
  }
  if (mark.kind === 'arrow') {
    const [from, to] = [place(mark.from), place(mark.to)];
    const turn = Math.atan2(to.y - from.y, to.x - from.x);
    const barb = (side: number) => {
      const angle = turn + Math.PI + side * 0.5;
      const length = longer * 0.03;
      return `${whole(to.x + length * Math.cos(angle))} ${whole(to.y + length * Math.sin(angle))}`;
    };
    const tip = `${whole(to.x)} ${whole(to.y)}`;
    return `M${whole(from.x)} ${whole(from.y)}L${tip}M${barb(1)}L${tip}L${barb(-1)}`;
  }
  return '';
}

/** How thick lines are, and how tall words, in points of the picture. */
export function markSizes({ widthPx, heightPx }: PhotoSize): { linePx: number; wordsPx: number } {
  const longer = Math.max(widthPx, heightPx);
  return { linePx: Math.max(2, longer / 200), wordsPx: Math.max(12, longer / 28) };
}

/** What is said of a photo where it cannot be seen: where it was taken, and the figures on it. */
export function captionOf(place: string, marks: readonly PhotoMark[]): string {
  const words = marks.flatMap((mark) => (mark.kind === 'words' ? [mark.words] : []));
  return [place, words.join(', ')].filter(Boolean).join(': ').slice(0, 300);
}

function whole(value: number): number {
  return Math.round(value * 10) / 10;
}
