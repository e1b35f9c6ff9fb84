'use client';

import { statusWords } from '@/components/diary/visit-words';
import { readQueue } from '@/components/phone/queue-store';
import { useLive } from '@/components/phone/use-live';
import { statusOnPhone } from '@/components/phone/visit-report';
import { Verdict } from '@/components/ui/verdict';
import type { TodayVisit } from '@/lib/contracts/visits';
import { useCrew } from './crew-language';

/** How the visit stands, with what was tapped here a moment ago. */
export function VisitState({ visit }: { visit: TodayVisit }) {
  const { words } = useCrew();
  const live = useLive('queue', readQueue);
  const status = statusOnPhone(visit, live.state === 'here' ? live.value : []);
  return <Verdict kind={statusWords[status].verdict}>{words.statuses[status]}</Verdict>;
}
