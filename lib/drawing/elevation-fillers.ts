import type { Run } from '@/lib/contracts/runs';
import type { RunEndFit, RunFit } from '@/lib/measure/run-fit';
import { roundedMm } from '@/lib/sheet/figure-text';
import { formatLength } from '@/lib/units/format-length';
import { type ElevationSheet, edgeAt, type WallPlace } from './elevation-frame';
import { bare } from './figure-spans';
import { hatch } from './hatch';
import { type Shape, smallTextSizePx, type Tone, text } from './shape';

const hatchPx = 5;

/** The fillers of a run, hatched. */
export function elevationFillers(sheet: ElevationSheet, run: Run, runFit: RunFit): Shape[] {
  return (['left', 'right'] as const).flatMap((side) => {
    const end = runFit[side];
    const unit = side === 'left' ? runFit.units[0] : runFit.units.at(-1);
    if (!end.filler || !unit) return [];
    const insideMm = side === 'left' ? unit.leftMm : unit.rightMm;
    const outside = outerEdge(sheet, { run, end, side, insideMm });
    const outline = [
      { xMm: insideMm, zMm: run.z0Mm },
      { xMm: insideMm, zMm: run.z1Mm },
      ...[...outside].reverse(),
    ].map(sheet.at);
    return [
      { kind: 'area', layer: 'filler', points: outline } satisfies Shape,
      ...hatch(outline, hatchPx, -45).map(
        (points): Shape => ({ kind: 'line', layer: 'filler-hatch', points }),
      ),
    ];
  });
}

/** The face widths of a run's fillers at the places where they hold, and the blank between them. */
export function fillerFigures(
  sheet: ElevationSheet,
  run: Run,
  runFit: RunFit,
  sides: readonly ('left' | 'right')[] = ['left', 'right'],
): Shape[] {
  return sides.flatMap((side) => {
    const end = runFit[side];
    const unit = side === 'left' ? runFit.units[0] : runFit.units.at(-1);
    if (!end.filler || !unit) return [];
    const insideMm = side === 'left' ? unit.leftMm : unit.rightMm;
    return figures(sheet, {
      end,
      side,
      outside: outerEdge(sheet, { run, end, side, insideMm }),
    });
  });
}

/** Foot to head: along the leaning wall, or straight up beside a casing, a cabinet or another run. */
function outerEdge(
  sheet: ElevationSheet,
  {
    run,
    end,
    side,
    insideMm,
  }: { run: Run; end: RunEndFit; side: 'left' | 'right'; insideMm: number },
): WallPlace[] {
  const sign = side === 'left' ? -1 : 1;
  if (end.meets !== 'wall') {
    const xMm = insideMm + sign * Math.max(0, end.filler?.least.value ?? 0);
    return [
      { xMm, zMm: run.z0Mm },
      { xMm, zMm: run.z1Mm },
    ];
  }
  const edge = sheet.edges[side];
  return [
    { xMm: edgeAt(edge, run.z0Mm), zMm: run.z0Mm },
    ...edge.filter(({ zMm }) => zMm > run.z0Mm && zMm < run.z1Mm),
    { xMm: edgeAt(edge, run.z1Mm), zMm: run.z1Mm },
  ];
}

function figures(
  sheet: ElevationSheet,
  { end, side, outside }: { end: RunEndFit; side: 'left' | 'right'; outside: readonly WallPlace[] },
): Shape[] {
  const { filler } = end;
  const [foot, head] = [outside[0], outside.at(-1)];
  if (!filler || !foot || !head) return [];
  const { unit, stepMm } = sheet.rules;
  const length = (mm: number) => bare(formatLength(mm, { unit, stepMm }));
  const [top, bottom] = [filler.widths[0], filler.widths.at(-1)];
  const tone: Tone = filler.verdict === 'fits' ? 'strong' : 'over';
  const lines: { zMm: number; words: string; tone: Tone; drop: number }[] = [
    {
      zMm: head.zMm,
      words: length(top?.width.value ?? filler.greatest.value),
      tone: 'plain',
      drop: 12,
    },
    {
      zMm: (foot.zMm + head.zMm) / 2,
      words: `blank ${length(roundedMm(filler.blank, stepMm))}`,
      tone,
      drop: 4,
    },
    {
      zMm: foot.zMm,
      words: length(bottom?.width.value ?? filler.least.value),
      tone: 'plain',
      drop: -5,
    },
  ];
  const away = side === 'left' ? -9 : 9;
  return lines.map(({ zMm, words, tone: lineTone, drop }) => {
    const xMm = edgeAt([foot, ...outside.slice(1, -1), head], zMm);
    const [x, y] = sheet.at({ xMm, zMm });
    return text([x + away, y + drop], words, {
      tone: lineTone,
      anchor: side === 'left' ? 'end' : 'start',
      sizePx: smallTextSizePx,
    });
  });
}
