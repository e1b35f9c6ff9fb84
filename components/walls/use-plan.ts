import { useEffect, useMemo, useState } from 'react';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { PlannedReading } from '@/lib/measure/missing-reading';

type Planner = typeof import('@/lib/measure/reading-plan');

/**
 * Every reading the room needs, taken ones too, worked out on the phone after each reading. The planner is
 * fetched once the page is up; until it is here the answer is null.
 */
export function usePlan(view: WallBookView): PlannedReading[] | null {
  const [planner, setPlanner] = useState<Planner | null>(null);
  useEffect(() => {
    let isShown = true;
    void import('@/lib/measure/reading-plan').then((module) => {
      if (isShown) setPlanner(module);
    });
    return () => {
      isShown = false;
    };
  }, []);
  return useMemo(
    () => planner?.readingPlan(view.wallBook, view.runs, view.rules) ?? null,
    [planner, view],
  );
}
