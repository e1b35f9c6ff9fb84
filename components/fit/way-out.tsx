'use client';

import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import type { FitView } from '@/lib/contracts/rooms';
import type { RunFit } from '@/lib/measure/run-fit';
import type { WayOut as Way } from '@/lib/sheet/with-widths';
import { Suggestion } from './suggestion';
import { useSaveRuns } from './use-save-runs';

type WayOutProps = {
  view: Pick<FitView, 'runs' | 'runsMark' | 'rules'> & { roomId: string };
  before: RunFit;
  way: Way;
};

/** The smallest change of widths that makes a run come out, before and after, and one touch to take it. */
export function WayOut({ view, before, way }: WayOutProps) {
  const { save, isBusy, problem } = useSaveRuns(view);
  const run = view.runs.find(({ id }) => id === before.runId);
  if (!run || !before.fill?.suggestion) return null;
  const runs = view.runs.map((one) => (one.id === run.id ? way.run : one));
  return (
    <div className="my-1.5 max-w-xl border-l-4 border-ochre bg-tint px-3 py-2 print:hidden">
      <Suggestion
        run={run}
        suggestion={before.fill.suggestion}
        before={before}
        after={way.after}
        rules={view.rules}
      />
      <FormError problem={problem} shownFields={[]} />
      <Button
        look="line"
        className="mt-2"
        busyText={isBusy ? 'Saving…' : undefined}
        onClick={() => void save(runs, `${run.name} has the new widths`)}
      >
        Take these widths
      </Button>
    </div>
  );
}
