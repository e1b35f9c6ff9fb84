'use client';

import { useLive } from '@/components/phone/use-live';
import { readVisitHere } from '@/components/phone/visit-store';
import type { TodayVisit } from '@/lib/contracts/visits';

/** The visit as this phone knows it: with what was tapped here a moment ago, sent or not. */
export function useVisitHere(drawn: TodayVisit): TodayVisit {
  const live = useLive(`visit:${drawn.id}`, () => readVisitHere(drawn));
  return live.state === 'here' ? live.value : drawn;
}
