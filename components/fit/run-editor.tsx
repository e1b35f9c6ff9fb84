'use client';

import { useRouter } from 'next/navigation';
import { useDeferredValue, useMemo, useState } from 'react';
import { DrawingView, scaleWords } from '@/components/drawing/drawing-view';
import { usePageKeys } from '@/components/shell/page-keys';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TitleBlock } from '@/components/ui/title-block';
import type { FitView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import { drawElevation } from '@/lib/drawing/elevation';
import { fitRoom } from '@/lib/measure/fit-room';
import { wayOutOf } from '@/lib/sheet/with-widths';
import { EndFields } from './end-fields';
import { InFractions } from './in-fractions';
import { RunFields } from './run-fields';
import { RunVerdict } from './run-verdict';
import { Suggestion } from './suggestion';
import { UnitRows } from './unit-rows';
import { useSaveRuns } from './use-save-runs';

export type RunEditorProps = {
  view: Pick<FitView, 'wallBook' | 'runs' | 'runsMark' | 'rules'>;
  /** The run as it stands, or a new one. */
  start: Run;
  /** Where to go when done. */
  backHref: string;
};

/** A run laid out by picking units; what it comes to is worked out with every key, by the same engine. */
export function RunEditor({ view, start, backHref }: RunEditorProps) {
  const router = useRouter();
  const { wallBook, rules } = view;
  const [run, setRun] = useState(start);
  const { save, isBusy, problem } = useSaveRuns({ ...view, roomId: wallBook.room.id });
  const others = view.runs.filter(({ id }) => id !== run.id);
  const isNew = others.length === view.runs.length;
  const place = isNew ? view.runs.length : view.runs.findIndex(({ id }) => id === run.id);
  const runs = isNew
    ? [...view.runs, run]
    : view.runs.map((one) => (one.id === run.id ? run : one));
  const change = (part: Partial<Run>) => setRun((current) => ({ ...current, ...part }));
  const errorOf = (field: string) => problem?.errors?.[`runs.${place}.${field}`];

  // Typing goes first; the fit follows as fast as the device can.
  const live = useLiveFit(view, useDeferredValue(run));
  const finish = async (all: Run[], told: string) => {
    if (await save(all, told)) router.push(backHref, { scroll: false });
  };
  const saveRun = () => void finish(runs, `${run.name} saved`);
  usePageKeys('This run', [{ keys: 's', words: 'save the run', run: saveRun }]);

  return (
    <section
      aria-label={`Lay out ${run.name}`}
      className="mt-4 mb-8 border border-ink bg-sheet px-4 py-3"
    >
      <TitleBlock
        title={isNew ? 'A new run' : `Lay out ${run.name}`}
        meta={live.drawing ? scaleWords(live.drawing, rules.unit) : null}
      />
      <div className="grid gap-x-8 gap-y-4 py-3 lg:grid-cols-[minmax(0,1fr)_20rem]">
        <div className="flex min-w-0 flex-col gap-3">
          <div role="status" className="min-h-6">
            {live.runFit?.fill ? (
              <p>
                <RunVerdict verdict={live.runFit.fill.verdict} className="mr-2" />
                <InFractions words={live.runFit.fill.words} />
              </p>
            ) : (
              <p className="text-graphite">
                Cannot be filled yet: the length of this wall or one of its corners is not read.
              </p>
            )}
          </div>
          {live.drawing ? (
            <DrawingView drawing={live.drawing} title={`${run.name}, seen square on`} />
          ) : null}
          <UnitRows
            run={run}
            rules={rules}
            onUnits={(units) => change({ units, share: stillShared(run.share, units) })}
          />
          {live.runFit?.fill?.suggestion && live.after ? (
            <div className="border-l-4 border-ochre bg-tint px-3 py-2">
              <Suggestion
                run={run}
                suggestion={live.runFit.fill.suggestion}
                before={live.runFit}
                after={live.after}
                rules={rules}
              />
              {live.changed ? (
                <Button
                  look="line"
                  className="mt-2"
                  onClick={() => live.changed && setRun(live.changed)}
                >
                  Use these widths
                </Button>
              ) : null}
            </div>
          ) : null}
        </div>
        <div className="flex flex-col gap-3">
          <RunFields {...{ run, rules, errorOf }} room={wallBook.room} onRun={change} />
          <EndFields
            side="left"
            {...{ run, others, rules }}
            onEnd={(left) => change({ left })}
            error={errorOf('left.runId')}
          />
          <EndFields
            side="right"
            {...{ run, others, rules }}
            onEnd={(right) => change({ right })}
            error={errorOf('right.runId')}
          />
        </div>
      </div>
      <FormError problem={problem} shownFields={shownErrors(place)} />
      <footer className="flex flex-wrap gap-2 border-t border-rule pt-3">
        <Button onClick={saveRun} busyText={isBusy ? 'Saving…' : undefined} keyName="S">
          Save the run
        </Button>
        <Button look="line" onClick={() => router.push(backHref, { scroll: false })}>
          Leave it as it was
        </Button>
        {isNew ? null : (
          <Button
            look="chalk"
            className="ml-auto"
            onClick={() => void finish(others.map(withoutEndAt(run.id)), `${run.name} taken away`)}
          >
            Take the run away
          </Button>
        )}
      </footer>
    </section>
  );
}

/** The fit with the run as it is being laid out, its drawing, and what the suggested widths would give. */
function useLiveFit({ wallBook, rules, runs: saved }: RunEditorProps['view'], run: Run) {
  return useMemo(() => {
    const runs = [...saved.filter(({ id }) => id !== run.id), run];
    const fit = fitRoom(wallBook, runs, rules);
    const runFit = fit.runs.find(({ runId }) => runId === run.id) ?? null;
    const wayOut = runFit ? wayOutOf({ wallBook, runs, rules }, runFit) : null;
    const changed = wayOut?.run ?? null;
    const after = wayOut?.after ?? runFit;
    const drawing = drawElevation({ wallBook, runs, fit, rules, wallId: run.wallId });
    return { runFit, after, changed, drawing };
  }, [wallBook, rules, saved, run]);
}

/** A unit that was on a mark and is taken out leaves the slack to both fillers. */
function stillShared(share: Run['share'], units: Run['units']): Run['share'] {
  const isGone = share.how === 'centred' && !units.some(({ id }) => id === share.unitId);
  return isGone ? { how: 'equal' } : share;
}

/** A run that met the one taken away meets the wall again. */
const withoutEndAt = (goneId: string) => (run: Run) => ({
  ...run,
  ...(run.left.kind === 'run' && run.left.runId === goneId
    ? { left: { kind: 'wall' } as const }
    : {}),
  ...(run.right.kind === 'run' && run.right.runId === goneId
    ? { right: { kind: 'wall' } as const }
    : {}),
});

const shownErrors = (place: number) =>
  [
    'name',
    'wallId',
    'z0Mm',
    'z1Mm',
    'carcassDepthMm',
    'doorMm',
    'share.unitId',
    'left.runId',
    'right.runId',
  ].map((field) => `runs.${place}.${field}`);
