'use client';

import { useEffect, useState } from 'react';
import type { CustomerTimesView } from '@/lib/contracts/visits';
import { customerWords } from './customer-words';

/** "until 10:45 AM" as the page arrives; counting down once scripts run. */
export function HoldLeft({
  holdEndsAt,
  language,
  until,
}: {
  holdEndsAt: string;
  language: CustomerTimesView['language'];
  until: string;
}) {
  const [secondsLeft, setSecondsLeft] = useState<number | null>(null);
  useEffect(() => {
    const count = () =>
      setSecondsLeft(Math.max(0, Math.round((Date.parse(holdEndsAt) - Date.now()) / 1000)));
    count();
    const timer = setInterval(count, 1000);
    return () => clearInterval(timer);
  }, [holdEndsAt]);
  const words = customerWords(language);
  if (secondsLeft === 0) return <span className="text-chalk">{words.keptOver}</span>;
  return (
    <span className="font-normal">
      {until}
      {secondsLeft === null ? null : (
        <span aria-hidden="true" className="tabular-nums">
          {' '}
          · {words.left(clockOf(secondsLeft))}
        </span>
      )}
    </span>
  );
}

/** 872 is "14:32". */
function clockOf(seconds: number): string {
  return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`;
}
