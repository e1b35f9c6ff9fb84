import type { SheetView } from '@/lib/contracts/rooms';
import type { Wall } from '@/lib/contracts/wall-book';
import { drawElevation } from '@/lib/drawing/elevation';
import { drawPlan } from '@/lib/drawing/plan';
import type { Drawing } from '@/lib/drawing/shape';
import type { RunFit } from '@/lib/measure/run-fit';
import { wallsOf } from '@/lib/sheet/room-names';

export type SheetDrawing = { id: string; title: string; drawing: Drawing };

/** The walls of a sheet that carry runs, as they are walked, each with its runs. */
export function wallsWithRuns({ wallBook, fit }: Pick<SheetView, 'wallBook' | 'fit'>) {
  return wallsOf(wallBook.room).flatMap(({ wall }): { wall: Wall; runs: RunFit[] }[] => {
    const runs = fit.runs.filter(({ wallId }) => wallId === wall.id);
    return runs.length > 0 ? [{ wall, runs }] : [];
  });
}

/** "Wall A: Sink wall, Uppers". */
export function elevationTitle(wall: Wall, runs: readonly RunFit[]): string {
  return `Wall ${wall.name}: ${runs.map(({ name }) => name).join(', ')}`;
}

/**
 * Every drawing of a sheet at one scale: the plan, then the elevation of each wall that carries runs.
 *
 * Example: a kitchen with runs on walls A and C gives a plan and two elevations.
 */
export function sheetDrawings(sheet: SheetView, { pxPerMm }: { pxPerMm: number }): SheetDrawing[] {
  const plan: SheetDrawing = {
    id: 'plan',
    title: `${sheet.roomName}, seen from above`,
    drawing: drawPlan(sheet, { pxPerMm }),
  };
  const elevations = wallsWithRuns(sheet).flatMap(({ wall, runs }): SheetDrawing[] => {
    const drawing = drawElevation({ ...sheet, wallId: wall.id }, { pxPerMm });
    if (!drawing) return [];
    const id = `wall-${wall.name.replace(/[^\w-]/g, '-')}`;
    return [{ id, title: elevationTitle(wall, runs), drawing }];
  });
  return [plan, ...elevations];
}

/** How much larger a drawing shows what is out of true; empty where it shows it as it is. */
export function outOfTrueWords({ exaggeration }: Drawing): string {
  return exaggeration === 1 ? '' : `out-of-true drawn ×${exaggeration}`;
}
