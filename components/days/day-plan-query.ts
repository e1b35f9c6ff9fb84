'use client';

import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type {
  AcceptDayPlanInput,
  AcceptedDayPlan,
  DayPlanView,
  PlanDayInput,
} from '@/lib/contracts/day-plans';
import { apiPaths } from '@/lib/paths';

export const daysKey = ['days'] as const;

/** The day as it stands and in a better order; for one crew, or with stops that may change crews. */
export const dayPlanQuery = (asked: PlanDayInput) =>
  queryOptions({
    queryKey: [...daysKey, 'plan', asked],
    queryFn: ({ signal }) =>
      askServer<DayPlanView>(apiPaths.planDay(), { method: 'POST', body: asked, signal }),
  });

export const useDayPlan = (asked: PlanDayInput) => useQuery(dayPlanQuery(asked));

export function useAcceptDayPlan() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: AcceptDayPlanInput) =>
      askServer<AcceptedDayPlan>(apiPaths.acceptDayPlan(), { body: input }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: daysKey }),
        client.invalidateQueries({ queryKey: ['visits'] }),
      ]),
  });
}
