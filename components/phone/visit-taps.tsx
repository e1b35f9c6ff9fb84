'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { TodayVisit } from '@/lib/contracts/visits';
import { HowLate } from './how-late';
import { usePersonId } from './phone-person';
import { keepWork, readQueue } from './queue-store';
import { useLive } from './use-live';
import { statusOnPhone, tapsFrom, tapWords, type VisitTap } from './visit-report';

/** One tap tells the office, and the office the customer; without a signal it is told later. */
export function VisitTaps({ visit }: { visit: TodayVisit }) {
  const personId = usePersonId();
  const live = useLive('queue', readQueue);
  const [problem, setProblem] = useState<string | null>(null);
  const status = statusOnPhone(visit, live.state === 'here' ? live.value : []);
  const [asksHowLate, setAsksHowLate] = useState(false);
  const tap = async (what: VisitTap, lateMinutes?: number) => {
    if (what === 'running-late' && lateMinutes === undefined) return setAsksHowLate(true);
    setAsksHowLate(false);
    try {
      const at = new Date().toISOString();
      const report = { visitId: visit.id, what, at, lateMinutes };
      await keepWork(personId, [{ kind: 'report', report }]);
      setProblem(null);
    } catch {
      setProblem('This phone could not keep it. Ring the office instead.');
    }
  };
  const taps = tapsFrom(status);
  if (asksHowLate) {
    return (
      <HowLate
        onSay={(minutes) => tap('running-late', minutes)}
        onLeave={() => setAsksHowLate(false)}
      />
    );
  }
  if (taps.length === 0) return null;
  return (
    <div className="flex flex-col gap-2">
      <div className="grid grid-cols-2 gap-2">
        {taps.map((what, at) => (
          <Button
            key={what}
            size="thumb"
            look={at === 0 ? 'fill' : what === 'nobody-home' ? 'chalk' : 'line'}
            onClick={() => tap(what)}
          >
            {tapWords[what]}
          </Button>
        ))}
      </div>
      {problem ? (
        <p role="alert" className="text-chalk">
          {problem}
        </p>
      ) : null}
    </div>
  );
}
