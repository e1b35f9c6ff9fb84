import { revisionCloud } from '@/lib/drawing/revision-cloud';
import { type TruePoint, type TrueShape, trueWords } from './true-shape';

/** Clouds are drawn at this many mm to a unit of the drawings, so that their puffs show at 1:20. */
const mmPerUnit = 8;
const aroundMm = 25;
const wordsMm = 45;

/**
 * What differs from the revision before, clouded on its own layer: the cloud, the letter, what stood there
 * with a line through it.
 *
 * Example: a box 762 wide gets a cloud 50 mm larger, "B" at its upper right and "36\"" struck under it.
 */
export function trueRevision(
  points: readonly TruePoint[],
  { revision, was }: { revision: string; was: string | null },
): TrueShape[] {
  if (points.length === 0) return [];
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const [left, right] = [Math.min(...xs) - aroundMm, Math.max(...xs) + aroundMm];
  const [bottom, top] = [Math.min(...ys) - aroundMm, Math.max(...ys) + aroundMm];
  const cloud = revisionCloud({
    left: left / mmPerUnit,
    top: -top / mmPerUnit,
    width: (right - left) / mmPerUnit,
    height: (top - bottom) / mmPerUnit,
  }).map(([x, y]): TruePoint => [x * mmPerUnit, -y * mmPerUnit]);
  const layer = 'Revision' as const;
  const letter = trueWords([right + 60, top + 20], revision, { layer, heightMm: 60 });
  return [
    { kind: 'outline', layer, points: cloud },
    letter,
    ...(was === null ? [] : struck([left, bottom - 60 - wordsMm], was)),
  ];
}

function struck([x, y]: TruePoint, was: string): TrueShape[] {
  const widthMm = was.length * wordsMm * 0.8;
  const middle = y + wordsMm / 2;
  return [
    trueWords([x, y], was, { layer: 'Revision', heightMm: wordsMm }),
    {
      kind: 'line',
      layer: 'Revision',
      points: [
        [x, middle],
        [x + widthMm, middle],
      ],
    },
  ];
}
