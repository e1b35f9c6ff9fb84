'use client';

import { useSyncExternalStore } from 'react';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { isPaused, onSiteMinutes } from '@/lib/days/on-site-minutes';
import { useCrew } from './crew-language';
import { useVisitHere } from './use-visit-here';

/** How long they have worked here today, without the pauses; new each minute. */
export function SiteTime({ visit, stop }: { visit: TodayVisit; stop: StopView }) {
  const { words } = useCrew();
  const times = useVisitHere(visit);
  const minuteNow = useSyncExternalStore(eachMinute, thisMinute, () => 0);
  if (times.arrivedAt === null || minuteNow === 0) return null;
  const nowMs = minuteNow * 60_000;
  const arrivedAt = laterOf(times.arrivedAt, dayBegan(visit, nowMs));
  const minutes = onSiteMinutes({ arrivedAt, leftAt: times.leftAt, pauses: stop.pauses }, nowMs);
  return (
    <p>
      {words.onSite(Math.floor(minutes / 60), minutes % 60)}
      {times.leftAt === null && isPaused(stop.pauses) ? `, ${words.paused}` : ''}
    </p>
  );
}

/** Where work goes over days, each begins anew: a night without a pause is no work. */
function dayBegan({ pieces }: TodayVisit, nowMs: number): string | null {
  return pieces.findLast(({ startsAt }) => Date.parse(startsAt) <= nowMs)?.startsAt ?? null;
}

const laterOf = (one: string, other: string | null) =>
  other !== null && other > one ? other : one;

const thisMinute = () => Math.floor(Date.now() / 60_000);

function eachMinute(listener: () => void): () => void {
  const timer = setInterval(listener, 15_000);
  return () => clearInterval(timer);
}
