'use client';

import { useState } from 'react';
import type { FitView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import { newRun } from '@/lib/sheet/new-run';
import { wallName } from '@/lib/sheet/room-names';
import { type FitChoice, fitHref } from './fit-links';
import { RunEditor } from './run-editor';

/** The editor of the run that the address names, or of a new one on the chosen wall. */
export function FitRunEditor({
  view,
  choice,
  wallId,
}: {
  view: Pick<FitView, 'wallBook' | 'runs' | 'runsMark' | 'rules' | 'jobId'>;
  choice: FitChoice;
  wallId?: string;
}) {
  const { wallBook, runs, rules, jobId } = view;
  const known = runs.find(({ id }) => id === choice.lay);
  const [blank] = useState<Run | null>(() =>
    wallId
      ? newRun(rules, {
          id: crypto.randomUUID(),
          wallId,
          name: `${wallName(wallBook.room, wallId)} base`,
          level: 'base',
        })
      : null,
  );
  const start = known ?? blank;
  if (!start) return null;
  return (
    <RunEditor
      key={`${start.id} ${view.runsMark}`}
      view={view}
      start={start}
      backHref={fitHref(jobId, wallBook.room.id, { wall: start.wallId })}
    />
  );
}
