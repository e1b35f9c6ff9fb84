'use client';

import { statusWords } from '@/components/diary/visit-words';
import { Verdict } from '@/components/ui/verdict';
import type { TodayVisit } from '@/lib/contracts/visits';
import { useCrew } from './crew-language';
import { useVisitHere } from './use-visit-here';

/** How the visit stands, with what was tapped here a moment ago. */
export function VisitState({ visit }: { visit: TodayVisit }) {
  const { words } = useCrew();
  const { status } = useVisitHere(visit);
  return <Verdict kind={statusWords[status].verdict}>{words.statuses[status]}</Verdict>;
}
