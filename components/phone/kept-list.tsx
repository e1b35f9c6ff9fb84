'use client';

import { useState } from 'react';
import { readPhotos, tryParkedPhotosAgain } from '@/components/photos/photo-store';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { DayEvent } from '@/lib/contracts/day-events';
import type { Queued } from '@/lib/sync/queued';
import { usePersonId } from './phone-person';
import { readQueue, tryParkedAgain } from './queue-store';
import { useLive } from './use-live';

/** What the office would not take: it stays on the phone, with the office's words, until it does. */
export function KeptList() {
  const personId = usePersonId();
  const live = useLive('parked', () => readParked(personId));
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
    <section id="kept" className="scroll-mt-14 px-3.5 py-4">
      <TitleBlock title="Not taken by the office" meta={`${parked.length} kept here`} />
      <ul className="divide-y divide-rule">
        {parked.map((item) => (
          <li key={item.id} className="py-2">
            <p className="font-medium">{item.what}</p>
            <p className="text-note text-chalk">{item.why}</p>
          </li>
        ))}
      </ul>
      <p className="py-2 text-note text-graphite">
        Nothing is lost: it stays on this phone. Once the cause is gone, try again.
      </p>
      <Button
        look="line"
        size="thumb"
        onClick={tryAgain}
        busyText={isTrying ? 'Trying…' : undefined}
      >
        Try again
      </Button>
    </section>
  );
}

type Parked = { id: string; what: string; why: string };

async function readParked(personId: string): Promise<Parked[]> {
  const items = (await readQueue()).map((item) => ({ ...item, what: workWords(item) }));
  const photos = (await readPhotos()).map((photo) => ({ ...photo, what: `Photo: ${photo.place}` }));
  return [...items, ...photos].flatMap(({ id, what, parked, personId: owner }) =>
    owner === personId && parked !== null ? [{ id, what, why: parked }] : [],
  );
}

function workWords({ work }: Queued): string {
  switch (work.kind) {
    case 'room':
      return `Drawing of ${work.room.name}`;
    case 'submit':
      return 'A wall book handed in';
    case 'report':
      return `Tap on a visit: ${work.report.what.replaceAll('-', ' ')}`;
    case 'event':
      return eventWords[work.event.what];
    case 'reading':
      return `A reading: ${work.reading.kind}, ${work.reading.typed || 'no figure'}`;
  }
}

const eventWords: Record<DayEvent['what'], string> = {
  pause: 'A pause on site',
  'go-on': 'Work gone on with',
  check: 'A line of the checklist',
  snag: 'A snag',
  'close-snag': 'A snag closed',
  'as-found': 'Readings as found',
  'sign-off': 'The customer’s signature',
  'code-seen': 'The access code was looked at',
};
