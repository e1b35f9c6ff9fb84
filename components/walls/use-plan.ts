import { useEffect, useMemo, useState } from 'react';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { PlannedReading } from '@/lib/measure/missing-reading';

type Planner = typeof import('@/lib/measure/reading-plan');
/** What says at once what a value means, and what cannot be. */
export type PadJudge = Pick<typeof import('@/lib/walls-pad/verdict-of'), 'verdictOf' | 'refusalOf'>;

/**
 * Every reading the room needs, taken ones too, worked out on the phone after each reading, and what judges them.
 * Both are fetched once the page is up, with the rule sets that they bring; until they are here the answer is null,
 * and nothing is asked.
 */
export function usePlan(view: WallBookView): { plan: PlannedReading[]; judge: PadJudge } | null {
  const [loaded, setLoaded] = useState<[Planner, PadJudge] | null>(null);
  useEffect(() => {
    let isShown = true;
    const both = [
      import('@/lib/measure/reading-plan'),
      import('@/lib/walls-pad/verdict-of'),
    ] as const;
    void Promise.all(both).then((modules) => {
      if (isShown) setLoaded(modules);
    });
    return () => {
      isShown = false;
    };
  }, []);
  return useMemo(() => {
    if (!loaded) return null;
    const [planner, judge] = loaded;
    return { plan: planner.readingPlan(view.wallBook, view.runs, view.rules), judge };
  }, [loaded, view]);
}
