'use client';

import { statusWords } from '@/components/diary/visit-words';
import { Verdict } from '@/components/ui/verdict';
import type { TodayVisit } from '@/lib/contracts/visits';
import { readQueue } from './queue-store';
import { useLive } from './use-live';
import { statusOnPhone } from './visit-report';

/** How the visit stands, with what was tapped here a moment ago. */
export function VisitState({ visit }: { visit: TodayVisit }) {
  const live = useLive('queue', readQueue);
  const { verdict, words } =
    statusWords[statusOnPhone(visit, live.state === 'here' ? live.value : [])];
  return <Verdict kind={verdict}>{words}</Verdict>;
}
