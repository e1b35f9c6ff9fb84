import type { Drawing } from '@/lib/drawing/shape';

export type PaperScale = { ratio: number; words: string };

/** ISO 5455 and what joiners draw to besides; architects' scales where feet are read off. */
const metric: PaperScale[] = [5, 10, 15, 20, 25, 30, 40, 50, 75, 100, 200].map((ratio) => ({
  ratio,
  words: `1:${ratio}`,
}));
const inFeet: PaperScale[] = [
  { ratio: 4, words: '3" to the foot (1:4)' },
  { ratio: 8, words: '1 1/2" to the foot (1:8)' },
  { ratio: 12, words: '1" to the foot (1:12)' },
  { ratio: 16, words: '3/4" to the foot (1:16)' },
  { ratio: 24, words: '1/2" to the foot (1:24)' },
  { ratio: 32, words: '3/8" to the foot (1:32)' },
  { ratio: 48, words: '1/4" to the foot (1:48)' },
  { ratio: 96, words: '1/8" to the foot (1:96)' },
];

const ptPerPaperMm = 72 / 25.4;

/**
 * The largest usual scale at which a drawing goes on a part of a page, and the drawing at that scale.
 *
 * Edge: letters keep their size at every scale, so the drawing is drawn anew for each that is tried; where
 * not even the smallest goes, it is drawn at that and made to fit, and is then at no scale.
 * Example: a wall of 3600 mm on 500 pt of width, metric, letters of 0.56 pt per unit: 1:25.
 */
export function drawnToScale(
  draw: (look: { pxPerMm: number }) => Drawing,
  {
    unit,
    width,
    height,
    ptPerPx,
  }: { unit: 'in' | 'mm'; width: number; height: number; ptPerPx: number },
): { drawing: Drawing; scale: PaperScale | null; ptPerPx: number } {
  const scales = unit === 'in' ? inFeet : metric;
  let last: Drawing | null = null;
  for (const scale of scales) {
    last = draw({ pxPerMm: ptPerPaperMm / scale.ratio / ptPerPx });
    const { bounds } = last;
    if (bounds.width * ptPerPx <= width && bounds.height * ptPerPx <= height) {
      return { drawing: last, scale, ptPerPx };
    }
  }
  const drawing = last ?? draw({ pxPerMm: 1 });
  const fit = Math.min(width / drawing.bounds.width, height / drawing.bounds.height);
  return { drawing, scale: null, ptPerPx: fit };
}
