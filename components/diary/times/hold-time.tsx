'use client';

import { useEffect, useState } from 'react';
import type { HeldVisit } from '@/lib/contracts/openings';
import { HeldActions } from './held-actions';

/** The time that is kept for the customer on the phone, with what is left of the quarter of an hour. */
export function HoldTime({ held, onDone }: { held: HeldVisit; onDone: () => void }) {
  const left = useSecondsUntil(held.holdEndsAt);
  return (
    <section aria-label="Held" className="my-2 flex flex-col gap-2 border border-ochre p-2.5">
      <p>
        <b>
          {held.dayWords}, {held.windowWords}
        </b>
        , {held.crewName}
      </p>
      <p className="text-ochre" role="timer">
        {left > 0
          ? `Kept for ${Math.floor(left / 60)}:${String(left % 60).padStart(2, '0')} more. Nobody else can take it.`
          : 'The quarter of an hour is over: the time is free for all again.'}
      </p>
      {left > 0 ? <HeldActions visitId={held.id} onDone={onDone} /> : null}
    </section>
  );
}

function useSecondsUntil(instant: string): number {
  const [left, setLeft] = useState(() => secondsUntil(instant));
  useEffect(() => {
    const tick = setInterval(() => setLeft(secondsUntil(instant)), 1000);
    return () => clearInterval(tick);
  }, [instant]);
  return left;
}

const secondsUntil = (instant: string) =>
  Math.max(0, Math.round((Date.parse(instant) - Date.now()) / 1000));
