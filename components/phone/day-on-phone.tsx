'use client';

import { useSyncExternalStore } from 'react';
import { Glyph } from '@/components/ui/glyph';
import { TitleBlock } from '@/components/ui/title-block';
import { useHolder } from './phone-person';
import { readReadiness } from './read-readiness';
import { useLive } from './use-live';
import { useStoragePersisted } from './use-storage-persisted';
import { hasWorker, subscribeToWorker } from './worker';

/** What of the day is on this phone, line by line, and how safe the browser keeps it. */
export function DayOnPhone() {
  const holder = useHolder();
  const isProgramKept = useSyncExternalStore(subscribeToWorker, hasWorker, () => false);
  const live = useLive(`ready:${isProgramKept}`, () => readReadiness(holder, isProgramKept));
  const isPersisted = useStoragePersisted();
  if (live.state !== 'here') return null;
  const { isReady, lines, asOf } = live.value;
  return (
    <section className="px-3.5 py-4">
      <TitleBlock
        title={isReady ? 'Ready for no signal' : 'Kept here so far'}
        meta={asOf ? `as of ${timeWords(asOf)}` : undefined}
      />
      <ul className="py-1">
        {lines.map(({ words, isKept }) => (
          <li key={words} className="flex items-center gap-2 py-1">
            <Glyph
              name={isKept ? 'confirmed' : 'waiting'}
              className={isKept ? 'text-moss' : 'text-ochre'}
            />
            {words}
          </li>
        ))}
      </ul>
      <p className="text-note text-graphite">
        {isPersisted === false
          ? 'Readings wait on this phone until they are sent. This browser may clear them when space runs very short: put Setwell on the home screen, and it will not.'
          : 'Readings wait on this phone until they are sent.'}
      </p>
    </section>
  );
}

function timeWords(instant: string): string {
  return new Date(instant).toLocaleTimeString(undefined, { hour: '2-digit', minute: '2-digit' });
}
