import { DrawingView, scaleWords } from '@/components/drawing/drawing-view';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import type { FitView } from '@/lib/contracts/rooms';
import type { Wall } from '@/lib/contracts/wall-book';
import { drawElevation } from '@/lib/drawing/elevation';
import type { RunFit } from '@/lib/measure/run-fit';
import { linesOfWall } from '@/lib/sheet/lines-of-wall';
import type { ReadingLine } from '@/lib/sheet/reading-lines';
import { wayOutOf } from '@/lib/sheet/with-widths';
import { fitHref } from './fit-links';
import { ReadingTable } from './reading-table';
import { RunSummary } from './run-summary';
import { TroubleList } from './trouble-list';
import { WallTabs } from './wall-tabs';
import { WayOut } from './way-out';

type WallPanelProps = {
  view: FitView;
  wall: Wall;
  lines: readonly ReadingLine[];
  mayLayOut: boolean;
};

/** One wall square on: its runs, what is in their way, and every reading of it. */
export function WallPanel({ view, wall, lines, mayLayOut }: WallPanelProps) {
  const { wallBook, runs, fit, rules, jobId } = view;
  const roomId = wallBook.room.id;
  const drawing = drawElevation({ wallBook, runs, fit, rules, wallId: wall.id });
  const ofWall = fit.runs.filter(({ wallId }) => wallId === wall.id);
  const ofWallLines = linesOfWall(lines, wallBook, wall.id);
  return (
    <section aria-labelledby="wall-title">
      <TitleBlock
        id="wall-title"
        title={`Wall ${wall.name}${ofWall.length > 0 ? `: ${ofWall.map(({ name }) => name).join(', ')}` : ''}`}
        meta={drawing ? `seen square on, ${scaleWords(drawing, rules.unit)}` : null}
      />
      <div className="py-2">
        <WallTabs
          room={wallBook.room}
          fit={fit}
          chosenId={wall.id}
          hrefOf={(wallId) => fitHref(jobId, roomId, { wall: wallId })}
        />
      </div>
      {drawing ? (
        <div className="border border-rule bg-sheet p-2">
          <DrawingView drawing={drawing} title={`Wall ${wall.name}, seen square on`} />
        </div>
      ) : null}
      <TroubleList fit={fit} runs={ofWall} />
      {ofWall.map((runFit) => (
        <RunSummary
          key={runFit.runId}
          runFit={runFit}
          rules={rules}
          editHref={
            mayLayOut ? fitHref(jobId, roomId, { wall: wall.id, lay: runFit.runId }) : undefined
          }
          wayOut={mayLayOut ? wayOut(view, runFit) : null}
        />
      ))}
      {mayLayOut ? (
        <LinkButton
          look="line"
          scroll={false}
          className="mt-3"
          href={fitHref(jobId, roomId, { wall: wall.id, lay: 'new' })}
        >
          Lay out a new run on wall {wall.name}
        </LinkButton>
      ) : null}
      <details className="mt-3">
        <summary className="font-bold">
          {ofWallLines.length === 1 ? '1 reading' : `${ofWallLines.length} readings`} of wall{' '}
          {wall.name}
        </summary>
        <ReadingTable lines={ofWallLines} caption={`Readings of wall ${wall.name}`} />
      </details>
    </section>
  );
}

/** Null where the run comes out, or no change of its widths can help. */
function wayOut(view: FitView, runFit: RunFit) {
  const way = wayOutOf(view, runFit);
  if (!way) return null;
  const { runs, runsMark, rules } = view;
  const roomId = view.wallBook.room.id;
  return (
    <WayOut key={runsMark} view={{ runs, runsMark, rules, roomId }} before={runFit} way={way} />
  );
}
