'use client';

import { useState } from 'react';
import { readPhotos, tryParkedPhotosAgain } from '@/components/photos/photo-store';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { Queued } from '@/lib/sync/queued';
import { type PhoneWords, phoneWords } from '@/lib/words/phone-words';
import { usePersonId } from './phone-person';
import { readQueue, tryParkedAgain } from './queue-store';
import { useCrewLanguage } from './spoken-language';
import { useLive } from './use-live';

/** What the office would not take: it stays on the phone, with the office's words, until it does. */
export function KeptList() {
  const personId = usePersonId();
  const language = useCrewLanguage();
  const words = phoneWords[language];
  const live = useLive(`parked:${language}`, () => readParked(personId, words));
  const [isTrying, setIsTrying] = useState(false);
  const parked = live.state === 'here' ? live.value : [];
  if (parked.length === 0) return null;
  const tryAgain = async () => {
    setIsTrying(true);
    await Promise.all([tryParkedAgain(personId), tryParkedPhotosAgain(personId)]).finally(() =>
      setIsTrying(false),
    );
  };
  return (
    <section id="kept" lang={language} className="scroll-mt-14 px-3.5 py-4">
      <TitleBlock title={words.notTaken} meta={words.keptHere(parked.length)} />
      <ul className="divide-y divide-rule">
        {parked.map((item) => (
          <li key={item.id} className="py-2">
            <p className="font-medium">{item.what}</p>
            <p className="text-note text-chalk">{item.why}</p>
          </li>
        ))}
      </ul>
      <p className="py-2 text-note text-graphite">{words.nothingLost}</p>
      <Button
        look="line"
        size="thumb"
        onClick={tryAgain}
        busyText={isTrying ? words.trying : undefined}
      >
        {words.tryAgain}
      </Button>
    </section>
  );
}

type Parked = { id: string; what: string; why: string };

async function readParked(personId: string, words: PhoneWords): Promise<Parked[]> {
  const items = (await readQueue()).map((item) => ({ ...item, what: workWords(item, words) }));
  const photos = (await readPhotos()).map((photo) => ({
    ...photo,
    what: words.work.photo(photo.place),
  }));
  return [...items, ...photos].flatMap(({ id, what, parked, personId: owner }) =>
    owner === personId && parked !== null ? [{ id, what, why: parked }] : [],
  );
}

function workWords({ work }: Queued, { work: say }: PhoneWords): string {
  switch (work.kind) {
    case 'room':
      return say.room(work.room.name);
    case 'submit':
      return say.submit;
    case 'report':
      return say.report(work.report.what);
    case 'event':
      return say.event[work.event.what];
    case 'reading':
      return [say.reading, work.reading.typed].filter(Boolean).join(': ');
  }
}
