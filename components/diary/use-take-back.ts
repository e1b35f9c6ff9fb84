'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import { sayProblem } from '@/components/shell/say-problem';
import { showToast } from '@/components/ui/toast-store';
import type { TakenBackVisit } from '@/lib/contracts/visit-changes';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { visitsKey } from './visits-query';
import { waitingKey } from './waiting-query';

/** Takes the last change of a visit back: the server knows what was before, and what was not told yet. */
export function useTakeBack() {
  const client = useQueryClient();
  const undo = useMutation({
    mutationFn: ({ id, version }: Pick<VisitView, 'id' | 'version'>) =>
      askServer<TakenBackVisit>(apiPaths.undoVisitChange(id), { body: { version } }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: visitsKey }),
        client.invalidateQueries({ queryKey: waitingKey }),
      ]),
  });

  return async (visit: Pick<VisitView, 'id' | 'version'>) => {
    try {
      const back = await undo.mutateAsync(visit);
      const { status, customerName, dayWords, windowWords } = back;
      const words =
        status === 'called-off'
          ? `${customerName} waits to be booked again${back.isHeldAgain ? ', the time is held as before' : ''}`
          : `${customerName} is back on ${dayWords}, ${windowWords}${back.isHeldAgain ? ', the other time is held as before' : ''}`;
      showToast({ text: `Taken back: ${words}` });
    } catch (caught) {
      sayProblem(caught);
    }
  };
}
