'use client';

import { useState } from 'react';
import { tapsFrom, type VisitTap } from '@/components/phone/visit-report';
import { Button } from '@/components/ui/button';
import type { PauseReason } from '@/lib/contracts/day-events';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { isPaused } from '@/lib/days/on-site-minutes';
import { useCrew } from './crew-language';
import { HowLate } from './how-late';
import { KeepFailed } from './keep-failed';
import { useReport } from './use-report';
import { useTell } from './use-tell';
import { WhyPause } from './why-pause';

type VisitTapsProps = { visit: TodayVisit; stop: StopView | null };

/** One tap tells the office, and the office the customer; without a signal it is told later. */
export function VisitTaps({ visit, stop }: VisitTapsProps) {
  const { words } = useCrew();
  const { status, report, isFailed: isNotKept } = useReport(visit);
  const { tell, isFailed } = useTell(visit.id);
  const [asks, setAsks] = useState<'how-late' | 'why-pause' | null>(null);
  const rests = stop !== null && isPaused(stop.pauses);

  const say = (what: VisitTap, lateMinutes?: number) => {
    if (what === 'running-late' && lateMinutes === undefined) return setAsks('how-late');
    setAsks(null);
    void report(what, lateMinutes);
  };
  const pause = async (why: PauseReason) => {
    if (await tell({ what: 'pause', why })) setAsks(null);
  };

  if (asks === 'how-late') {
    return (
      <HowLate onSay={(minutes) => say('running-late', minutes)} onLeave={() => setAsks(null)} />
    );
  }
  if (asks === 'why-pause') return <WhyPause onSay={pause} onLeave={() => setAsks(null)} />;
  const taps = tapsFrom(status);
  if (taps.length === 0) return null;
  return (
    <div className="flex flex-col gap-2">
      {status === 'on-site' && rests ? (
        <Button size="thumb" onClick={() => void tell({ what: 'go-on' })}>
          {words.goOn}
        </Button>
      ) : null}
      <div className="grid grid-cols-2 gap-2">
        {taps.flatMap((what, at) => [
          <Button
            key={what}
            size="thumb"
            look={at === 0 && !rests ? 'fill' : what === 'nobody-home' ? 'chalk' : 'line'}
            onClick={() => say(what)}
          >
            {words.taps[what]}
          </Button>,
          // Beside "Done", so that "Nobody home" is not hit for it.
          what === 'done' && !rests ? (
            <Button key="pause" size="thumb" look="line" onClick={() => setAsks('why-pause')}>
              {words.pause}
            </Button>
          ) : null,
        ])}
      </div>
      <KeepFailed isFailed={isNotKept || isFailed} />
    </div>
  );
}
