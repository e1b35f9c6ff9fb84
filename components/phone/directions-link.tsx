'use client';

import { useSyncExternalStore } from 'react';
import { directionsHref } from './directions';

const never = () => () => {};

/** To the phone's own map. */
export function DirectionsLink({
  street,
  town,
  words,
}: {
  street: string;
  town: string;
  words: string;
}) {
  const agent = useSyncExternalStore(
    never,
    () => navigator.userAgent,
    () => '',
  );
  return (
    <a
      href={directionsHref(street, town, agent)}
      className="flex min-h-thumb items-center justify-center rounded border border-pine font-bold text-pine active:bg-tint"
    >
      {words}
    </a>
  );
}
