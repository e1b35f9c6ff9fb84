import type { Run } from '@/lib/contracts/runs';
import { elevationDimensions } from './elevation-dimensions';
import { elevationFeatures } from './elevation-features';
import { elevationFillers, fillerFigures } from './elevation-fillers';
import {
  type ElevationSheet,
  type ElevationSource,
  edgeAt,
  elevationFrame,
} from './elevation-frame';
import { elevationLevels } from './elevation-levels';
import { elevationRevisions } from './elevation-revisions';
import { elevationTrouble } from './elevation-trouble';
import { elevationUnits } from './elevation-units';
import { elevationStuds, elevationWall } from './elevation-wall';
import { boundsOf, type Drawing, type Shape } from './shape';

/**
 * A wall seen square on with every run that stands or hangs on it: boxes, hatched fillers with their taper,
 * kick, counter, studs, what is on the wall, heights and widths; out-of-true drawn larger.
 *
 * Edge: a wall that the room has not gives null; before anything is read, the wall as it was drawn.
 */
export function drawElevation(
  source: ElevationSource,
  /** The wall as wide as this, or to a scale of its own. */
  look: { widthPx?: number } | { pxPerMm: number } = {},
): Drawing | null {
  const sheet = elevationFrame(source, look);
  if (!sheet) return null;
  const hung = sheet.ofWall.filter(({ run }) => run.level === 'wall');
  const standing = sheet.ofWall.filter(({ run }) => run.level !== 'wall');
  const runParts = (runs: typeof hung): Shape[] =>
    runs.map(({ run, runFit }) => ({
      kind: 'part',
      part: { kind: 'run', id: run.id },
      label: run.name,
      shapes: [
        ...elevationUnits(sheet, run, runFit),
        ...elevationFillers(sheet, run, runFit),
        ...(run.level === 'base' ? counter(sheet, run, runFit) : []),
      ],
    }));
  const shapes = [
    ...elevationWall(sheet),
    ...runParts(hung),
    ...elevationStuds(sheet),
    ...runParts(standing),
    ...elevationFeatures(sheet),
    ...elevationLevels(sheet),
    ...sheet.ofWall.flatMap(({ run, runFit }) => fillerFigures(sheet, run, runFit)),
    ...elevationDimensions(sheet),
    ...elevationTrouble(sheet),
    ...elevationRevisions(sheet),
  ];
  const { exaggeration, pxPerMm } = sheet;
  return { shapes, bounds: boundsOf(shapes, 12), exaggeration, pxPerMm };
}

/** The top over a base run: to the wall where the run meets it, over the last box where it ends free. */
function counter(
  sheet: ElevationSheet,
  run: Run,
  runFit: ElevationSheet['ofWall'][number]['runFit'],
): Shape[] {
  const [first, last] = [runFit.units[0], runFit.units.at(-1)];
  const thicknessMm = sheet.rules.counterTopMm - sheet.rules.baseTopMm;
  if (!first || !last || thicknessMm <= 0) return [];
  const overhangMm = 25;
  const isAtWall = (meets: string) => meets !== 'open';
  const leftMm = isAtWall(runFit.left.meets)
    ? edgeAt(sheet.edges.left, run.z1Mm)
    : first.leftMm - overhangMm;
  const rightMm = isAtWall(runFit.right.meets)
    ? edgeAt(sheet.edges.right, run.z1Mm)
    : last.rightMm + overhangMm;
  const corner = (xMm: number, zMm: number) => sheet.at({ xMm, zMm });
  return [
    {
      kind: 'area',
      layer: 'counter',
      points: [
        corner(leftMm, run.z1Mm),
        corner(rightMm, run.z1Mm),
        corner(rightMm, run.z1Mm + thicknessMm),
        corner(leftMm, run.z1Mm + thicknessMm),
      ],
    },
  ];
}
