/** Whether the units come in: through each doorway read, and round the passage behind it. */
import type { ReadingOf } from '@/lib/contracts/readings';
import type { Run, Unit } from '@/lib/contracts/runs';
import { figure } from '@/lib/measure/figure';
import type { WayInFit } from '@/lib/measure/fit';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import { type Box, passesDoor, turnsCorner } from '@/lib/measure/way-in';

/** For each doorway, every unit that does not come in, and else the tightest that does. */
export function fitWayIn(context: FitContext): WayInFit[] {
  return context.book.ofKind('doorway').flatMap((doorway) => {
    const seen = new Set<string>();
    const tried = context.runs.flatMap((run) =>
      run.units.flatMap((unit): WayInFit[] => {
        const box = boxOf(run, unit);
        const key = Object.values(box).join();
        if (unit.kind === 'open' || seen.has(key)) return [];
        seen.add(key);
        const way = throughDoor(context, doorway, run, unit, box);
        return way ? [way] : [];
      }),
    );
    const failing = tried.filter(({ passes }) => !passes);
    if (failing.length > 0) return failing;
    const [first, ...rest] = tried;
    if (!first) return [];
    return [
      rest.reduce((tight, way) => (way.margin.value < tight.margin.value ? way : tight), first),
    ];
  });
}

function boxOf(run: Run, unit: Unit): Box {
  return {
    widthMm: unit.widthMm,
    depthMm: run.carcassDepthMm,
    heightMm: Math.max(1, run.z1Mm - run.z0Mm),
  };
}

function throughDoor(
  context: FitContext,
  doorway: ReadingOf<'doorway'>,
  run: Run,
  unit: Unit,
  box: Box,
): WayInFit | null {
  const tool = context.book.toolOf(doorway);
  const read = (mm: number) => figure(mm, lengthUncertainty(tool, mm, 2), [doorway.id]);
  const clearWidth = read(doorway.clearWidthMm);
  const clearHeight = read(doorway.clearHeightMm);
  const door = passesDoor(box, { clearWidth, clearHeight }).value;
  if (!door) return null;
  const { passageWidthMm } = doorway;
  const turn =
    passageWidthMm === undefined
      ? null
      : turnsCorner(box, { widthIn: read(passageWidthMm), widthOut: clearWidth, clearHeight })
          .value;
  const tight = turn && turn.margin.value < door.margin.value ? turn : door;
  return {
    readingId: doorway.id,
    name: doorway.name,
    unitId: unit.id,
    runId: run.id,
    passes: door.passes && (turn?.passes ?? true),
    margin: fitFigure('way-in-margin', tight.margin),
    words: tight.words,
  };
}
