'use client';

import { useSyncExternalStore } from 'react';
import { Glyph } from '@/components/ui/glyph';
import { TitleBlock } from '@/components/ui/title-block';
import { phoneWords } from '@/lib/words/phone-words';
import { useHolder } from './phone-person';
import { readReadiness } from './read-readiness';
import { useCrewLanguage } from './spoken-language';
import { useLive } from './use-live';
import { useStoragePersisted } from './use-storage-persisted';
import { hasWorker, subscribeToWorker } from './worker';

/** What of the day is on this phone, line by line, and how safe the browser keeps it. */
export function DayOnPhone() {
  const holder = useHolder();
  const isProgramKept = useSyncExternalStore(subscribeToWorker, hasWorker, () => false);
  const language = useCrewLanguage();
  const words = phoneWords[language];
  const live = useLive(`ready:${isProgramKept}:${language}`, () =>
    readReadiness(holder, isProgramKept, language),
  );
  const isPersisted = useStoragePersisted();
  if (live.state !== 'here') return null;
  const { isReady, lines, asOf } = live.value;
  return (
    <section lang={language} className="px-3.5 py-4">
      <TitleBlock
        title={isReady ? words.ready : words.keptSoFar}
        meta={asOf ? words.asOf(timeWords(asOf)) : undefined}
      />
      <ul className="py-1">
        {lines.map(({ words: line, isKept }) => (
          <li key={line} className="flex items-center gap-2 py-1">
            <Glyph
              name={isKept ? 'confirmed' : 'waiting'}
              className={isKept ? 'text-moss' : 'text-ochre'}
            />
            {line}
          </li>
        ))}
      </ul>
      <p className="text-note text-graphite">
        {isPersisted === false ? words.mayBeCleared : words.waitHere}
      </p>
    </section>
  );
}

function timeWords(instant: string): string {
  return new Date(instant).toLocaleTimeString(undefined, { hour: '2-digit', minute: '2-digit' });
}
