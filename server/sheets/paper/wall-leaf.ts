import type { Wall } from '@/lib/contracts/wall-book';
import { drawElevation } from '@/lib/drawing/elevation';
import { runFacts, shareOfRun } from '@/lib/export/run-facts';
import { elevationTitle } from '@/lib/export/sheet-drawings';
import { troubleOf } from '@/lib/export/trouble';
import type { RunFit } from '@/lib/measure/run-fit';
import type { Paragraph, Section } from './column';
import type { Paper } from './leaf';
import { putBeside } from './put-beside';

/** A page for a wall: its elevation, and what the room leaves each run on it. */
export function putWallLeaf(paper: Paper, { wall, runs }: { wall: Wall; runs: RunFit[] }): void {
  const { sheet } = paper;
  putBeside(paper, {
    title: elevationTitle(wall, runs),
    view: 'seen square on',
    draw: (look) => {
      const drawing = drawElevation({ ...sheet, wallId: wall.id }, look);
      if (!drawing) throw new Error(`wall ${wall.id} is not in its own room`);
      return drawing;
    },
    sections: [...runs.map((run) => runSection(paper, run)), trouble(paper, runs)],
  });
}

function runSection({ sheet }: Paper, run: RunFit): Section {
  const { fill } = run;
  const verdict: Paragraph = fill
    ? { words: fill.words, mark: shareOfRun[fill.verdict], look: { weight: 500 } }
    : { words: 'Not filled: too little is read.', mark: 'over', look: { weight: 500 } };
  return {
    title: run.name,
    paragraphs: [verdict, ...runFacts(run, sheet.rules).map((words) => ({ words }))],
  };
}

function trouble({ sheet }: Paper, runs: readonly RunFit[]): Section {
  const words = troubleOf(
    sheet.fit,
    runs.map(({ runId }) => runId),
  );
  return { title: 'To watch', paragraphs: words.map((one) => ({ words: one, mark: 'over' })) };
}
