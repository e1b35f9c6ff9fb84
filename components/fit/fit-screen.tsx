import { DrawingView, scaleWords } from '@/components/drawing/drawing-view';
import { EmptyState } from '@/components/ui/empty-state';
import { TitleBlock } from '@/components/ui/title-block';
import type { FitView } from '@/lib/contracts/rooms';
import { drawPlan } from '@/lib/drawing/plan';
import type { DrawnPart } from '@/lib/drawing/shape';
import { cutList } from '@/lib/sheet/cut-list';
import { nextRevision } from '@/lib/sheet/next-revision';
import { openPoints } from '@/lib/sheet/open-points';
import { proofRows } from '@/lib/sheet/proof-rows';
import { readingLines } from '@/lib/sheet/reading-lines';
import { releaseStops } from '@/lib/sheet/release-stops';
import { wallsOf } from '@/lib/sheet/room-names';
import { ClosurePanel } from './closure-panel';
import { CutList } from './cut-list';
import { Figures } from './figures';
import { type FitChoice, fitHref } from './fit-links';
import { FitRunEditor } from './fit-run-editor';
import { MissingList } from './missing-list';
import { ProofTable } from './proof-table';
import { ReleasePanel } from './release-panel';
import { RevisionList } from './revision-list';
import { VerdictList } from './verdict-list';
import { WallPanel } from './wall-panel';

export type FitScreenProps = {
  view: FitView;
  choice: FitChoice;
  mayLayOut: boolean;
  mayRelease: boolean;
};

/** A room's fit: the plan as the way in, the chosen wall square on, and beside them what is proved, cut, open. */
export function FitScreen({ view, choice, mayLayOut, mayRelease }: FitScreenProps) {
  const { wallBook, fit, rules, runs, missing, jobId, releases } = view;
  const { room } = wallBook;
  const lines = readingLines(wallBook, view.takenBy, rules.unit, rules.region);
  const walls = wallsOf(room).map(({ wall }) => wall);
  const ofRun = runs.find(({ id }) => id === choice.lay)?.wallId;
  const chosen =
    walls.find(({ id }) => id === (choice.wall ?? ofRun)) ?? firstWithRun(view) ?? walls[0];
  const plan = drawPlan({ wallBook, runs, fit, rules });
  const hrefOf = (part: DrawnPart['part']): string | null => {
    if (part.kind === 'revision') return null;
    const wallId = part.kind === 'run' ? runs.find(({ id }) => id === part.id)?.wallId : part.id;
    return wallId ? fitHref(jobId, room.id, { wall: wallId }) : null;
  };
  return (
    <Figures readings={lines} rules={rules}>
      <TitleBlock
        level={1}
        title={`${view.customerName} · ${room.name}`}
        meta={`${view.jobTitle}, ${view.street} · ${fit.readingIds.length} readings`}
      />
      {choice.lay ? (
        <FitRunEditor
          view={{ wallBook, runs, runsMark: view.runsMark, rules, jobId }}
          choice={choice}
          wallId={chosen?.id}
        />
      ) : null}
      <div className="mt-4 grid gap-x-10 gap-y-6 xl:grid-cols-[minmax(0,1fr)_27rem]">
        <div className="flex min-w-0 flex-col gap-6">
          <section>
            <TitleBlock title="Plan" meta={scaleWords(plan, rules.unit)} />
            {walls.length === 0 ? (
              <EmptyState title="No wall is drawn yet">
                The measurer draws the room on the phone at the site measure.
              </EmptyState>
            ) : (
              <div className="mt-2 border border-rule bg-sheet p-2">
                <DrawingView
                  drawing={plan}
                  title={`${room.name}, seen from above`}
                  hrefOf={hrefOf}
                />
              </div>
            )}
          </section>
          {chosen ? (
            <WallPanel view={view} wall={chosen} lines={lines} mayLayOut={mayLayOut} />
          ) : null}
          <section>
            <TitleBlock title="Proved on site" />
            <ProofTable rows={proofRows(fit, rules)} />
          </section>
        </div>
        <div className="flex min-w-0 flex-col gap-6">
          <section>
            <TitleBlock title="What the room says" meta={revisionWords(view)} />
            <VerdictList
              {...{ fit, room, rules }}
              wallHref={(wall) => fitHref(jobId, room.id, { wall })}
            />
          </section>
          <section>
            <TitleBlock title="Does it close?" meta={fit.closure.suspect ? 'look again' : null} />
            <ClosurePanel view={view} />
          </section>
          <section>
            <TitleBlock title="Cut list" meta={rules.unit === 'in' ? 'inches' : 'millimetres'} />
            <CutList rows={cutList(fit, runs, rules.region)} />
          </section>
          <section>
            <TitleBlock title="Still to read" meta={missingWords(missing)} />
            <MissingList missing={missing} />
          </section>
          <section>
            <TitleBlock title="Release" />
            {mayRelease && runs.length > 0 ? (
              <ReleasePanel
                jobId={jobId}
                roomId={room.id}
                seenReadingIds={fit.readingIds}
                seenRunsMark={view.runsMark}
                nextRevision={nextRevision(releases[0]?.revision ?? null)}
                openPoints={openPoints(fit, missing)}
                stops={releaseStops(fit)}
                changes={view.changesSinceRelease}
              />
            ) : null}
            <RevisionList jobId={jobId} roomId={room.id} releases={releases} />
          </section>
        </div>
      </div>
    </Figures>
  );
}

/** Where there is most to see. */
function firstWithRun({ wallBook, runs }: FitView) {
  const [run] = runs;
  return wallsOf(wallBook.room).find(({ wall }) => wall.id === run?.wallId)?.wall;
}

function revisionWords({ releases, changesSinceRelease }: FitView): string {
  const [newest] = releases;
  if (!newest) return 'nothing released';
  const isChanged = changesSinceRelease && changesSinceRelease.length > 0;
  return isChanged ? `changed since revision ${newest.revision}` : `as revision ${newest.revision}`;
}

function missingWords(missing: FitView['missing']): string {
  const must = missing.filter(({ need }) => need === 'must').length;
  return must === 0 ? 'nothing that a cut size hangs on' : `${must} that cut sizes hang on`;
}
