import { DrawingView, scaleWords } from '@/components/drawing/drawing-view';
import { CutList } from '@/components/fit/cut-list';
import { Figures } from '@/components/fit/figures';
import { ProofTable } from '@/components/fit/proof-table';
import { RunSummary } from '@/components/fit/run-summary';
import { TroubleList } from '@/components/fit/trouble-list';
import { TitleBlock } from '@/components/ui/title-block';
import type { SheetView } from '@/lib/contracts/rooms';
import { drawElevation } from '@/lib/drawing/elevation';
import { drawPlan } from '@/lib/drawing/plan';
import { paths } from '@/lib/paths';
import { cautionsFor } from '@/lib/sheet/cautions';
import { cutList } from '@/lib/sheet/cut-list';
import { proofRows } from '@/lib/sheet/proof-rows';
import { readingLines } from '@/lib/sheet/reading-lines';
import { wallsOf } from '@/lib/sheet/room-names';
import { tradeWord } from '@/lib/words/trade';
import { SheetBar } from './sheet-bar';
import { SheetChanges } from './sheet-changes';
import { SheetFiles } from './sheet-files';
import { SheetLeaf } from './sheet-leaf';

type ShopSheetProps = { sheet: SheetView; mayTakeUp: boolean };

/** The released fit for the bench: a leaf for the room, then one for every wall with a run. */
export function ShopSheet({ sheet, mayTakeUp }: ShopSheetProps) {
  const { wallBook, runs, fit, rules, revised } = sheet;
  const walls = wallsOf(wallBook.room)
    .map(({ wall }) => wall)
    .filter(({ id }) => runs.some(({ wallId }) => wallId === id));
  const count = walls.length + 1;
  const cuts = cutList(fit, runs, rules.region);
  const plan = drawPlan({ wallBook, runs, fit, rules, revised });
  return (
    <Figures readings={readingLines(wallBook, {}, rules.unit, rules.region)} rules={rules}>
      <SheetBar
        release={sheet.release}
        newerRevision={sheet.newerRevision}
        fitHref={paths.room(sheet.jobId, wallBook.room.id)}
        mayTakeUp={mayTakeUp}
      />
      <SheetFiles releaseId={sheet.release.id} />
      <article
        aria-label={`Shop sheet, ${sheet.roomName}, revision ${sheet.release.revision}`}
        className={`shop-sheet text-note ${rules.region === 'US' ? 'on-letter' : 'on-a4'}`}
      >
        <SheetLeaf
          sheet={sheet}
          title={`${sheet.roomName}: plan`}
          meta={`seen from above, ${scaleWords(plan, rules.unit)}`}
          leaf={{ number: 1, count }}
          drawing={
            <>
              <DrawingView drawing={plan} title={`${sheet.roomName}, seen from above`} />
              <div className="mt-3 flex flex-col gap-3">
                <SheetChanges sheet={sheet} />
                <Cautions sheet={sheet} />
              </div>
            </>
          }
        >
          <section>
            <TitleBlock level={3} title="Proved on site" />
            <ProofTable rows={proofRows(fit, rules)} />
          </section>
        </SheetLeaf>
        {walls.map((wall, index) => {
          const ofWall = fit.runs.filter(({ wallId }) => wallId === wall.id);
          const drawing = drawElevation({ wallBook, runs, fit, rules, revised, wallId: wall.id });
          return (
            <SheetLeaf
              key={wall.id}
              sheet={sheet}
              title={`Wall ${wall.name}: ${ofWall.map(({ name }) => name).join(', ')}`}
              meta={drawing ? `seen square on, ${scaleWords(drawing, rules.unit)}` : ''}
              leaf={{ number: index + 2, count }}
              drawing={
                <>
                  {drawing ? (
                    <DrawingView drawing={drawing} title={`Wall ${wall.name}, seen square on`} />
                  ) : null}
                  {ofWall.map((runFit) => (
                    <RunSummary key={runFit.runId} runFit={runFit} rules={rules} />
                  ))}
                  <TroubleList fit={fit} runs={ofWall} />
                </>
              }
            >
              <section>
                <TitleBlock
                  level={3}
                  title={`Cut list: fillers, scribes, ${tradeWord('kick', rules.region)}`}
                  meta={rules.unit === 'in' ? 'inches' : 'millimetres'}
                />
                <CutList rows={cuts.filter(({ wallId }) => wallId === wall.id)} revised={revised} />
              </section>
            </SheetLeaf>
          );
        })}
      </article>
    </Figures>
  );
}

function Cautions({ sheet }: { sheet: SheetView }) {
  const { runs, wallBook, isOldHouse } = sheet;
  return (
    <section className="border-l-4 border-chalk pl-3">
      <h3 className="font-bold">Cautions</h3>
      <ul className="gap-x-6 sm:columns-2">
        {cautionsFor({ runs, readings: wallBook.readings, isOldHouse }).map((words) => (
          <li key={words} className="break-inside-avoid">
            {words}
          </li>
        ))}
      </ul>
    </section>
  );
}
