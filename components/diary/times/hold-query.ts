'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { visitsKey } from '@/components/diary/visits-query';
import { waitingKey } from '@/components/diary/waiting-query';
import { askServer } from '@/components/shell/ask-server';
import type { HeldVisit, HeldVisitInput, HoldOpeningInput } from '@/lib/contracts/openings';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { openingsKey } from './openings-query';

/** A hold takes time out of the diary and gives it back: all that shows free time is fetched anew. */
function useHoldChange<Input, Answer>(path: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: Input) => askServer<Answer>(path, { body: input }),
    onSettled: () =>
      Promise.all(
        [visitsKey, waitingKey, openingsKey].map((queryKey) =>
          client.invalidateQueries({ queryKey }),
        ),
      ),
  });
}

export const useHoldOpening = () =>
  useHoldChange<HoldOpeningInput, HeldVisit>(apiPaths.holdOpening());
export const useTakeHeldTime = () =>
  useHoldChange<HeldVisitInput, VisitView>(apiPaths.takeHeldTime());
export const useLetGoHeldTime = () =>
  useHoldChange<HeldVisitInput, unknown>(apiPaths.letGoHeldTime());
