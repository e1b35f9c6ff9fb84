'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';
import { StopScreen } from '@/components/day/stop-screen';
import { TodayScreen } from '@/components/day/today-screen';
import { PhoneShell } from '@/components/shell/phone-shell';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import { RoomScreen } from '@/components/walls/room-screen';
import type { TodayView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import type { Holder } from '@/lib/sync/holder';
import { type PhonePlace, phonePlaceOf } from '@/lib/sync/phone-pages';
import type { CrewLanguage } from '@/lib/words/crew';
import { type KeptThing, phoneWords } from '@/lib/words/phone-words';
import { readDay, readDays, readFetched, readHolder } from './kept-store';
import { localToday } from './local-today';
import { PhonePerson } from './phone-person';
import { readBook } from './read-book';
import { readUnsent } from './read-unsent';
import { useCrewLanguage } from './spoken-language';
import { useLive } from './use-live';
import { useOnce } from './use-once';

const never = () => () => {};

/**
 * Stands in for every phone page where there is no signal: shows what the phone keeps for the address that
 * was asked for, to the person that it keeps it for.
 */
export function KeptPage() {
  const address = useSyncExternalStore(
    never,
    () => window.location.pathname + window.location.search,
    () => null,
  );
  const live = useOnce('holder', readHolder);
  if (address === null || live.state === 'reading') return <Opening />;
  if (live.state === 'failed' || live.value === null) return <NobodyHere />;
  const [pathname = '', search = ''] = address.split('?');
  return (
    <PhonePerson holder={live.value}>
      <KeptPlace place={phonePlaceOf(pathname, search)} holder={live.value} />
    </PhonePerson>
  );
}

const titles: Record<CrewLanguage, Record<PhonePlace['page'], string>> = {
  en: { today: 'Today', visit: 'Visit', walls: 'Wall book', unknown: 'No signal' },
  es: { today: 'Hoy', visit: 'Visita', walls: 'Libro de medidas', unknown: 'Sin señal' },
};

function KeptPlace({ place, holder }: { place: PhonePlace; holder: Holder }) {
  const title = titles[useCrewLanguage()][place.page];
  useEffect(() => {
    document.title = `${title} · Setwell`;
  }, [title]);
  switch (place.page) {
    case 'today':
      return <KeptDay date={place.date} />;
    case 'visit':
      return <KeptVisit visitId={place.visitId} />;
    case 'walls':
      return <KeptBook roomId={place.roomId} jobId={place.jobId} holder={holder} />;
    case 'unknown':
      return <NotKept what="page" />;
  }
}

function KeptDay({ date }: { date: string | null }) {
  const [today] = useState(() => localToday());
  const live = useLive(`day:${date ?? today}`, () => readDayOf(date, today));
  if (live.state === 'reading') return <Opening />;
  if (live.state === 'failed' || !live.value) return <NotKept what="day" />;
  return <TodayScreen view={live.value} />;
}

function KeptVisit({ visitId }: { visitId: string }) {
  const live = useLive('days', readDays);
  if (live.state === 'reading') return <Opening />;
  const days = live.state === 'here' ? live.value : [];
  const visit = days.flatMap((day) => day.visits).find(({ id }) => id === visitId);
  return visit ? <StopScreen visit={visit} stop={null} /> : <NotKept what="visit" />;
}

function KeptBook(asked: { roomId: string; jobId: string | null; holder: Holder }) {
  const { roomId, jobId, holder } = asked;
  // Once: the screen writes the book that it was given, and then follows the store by itself.
  const once = useOnce(`book:${roomId}`, () => readBook(roomId, jobId, holder.personId));
  if (once.state === 'reading') return <Opening />;
  if (once.state === 'failed' || !once.value) return <NotKept what="room" />;
  return <RoomScreen view={once.value} isStale />;
}

/** The day that was asked for; else today's, or the one that was fetched last: its heading says which. */
async function readDayOf(date: string | null, today: string): Promise<TodayView | null> {
  if (date !== null) return readDay(date);
  const fetched = await readFetched();
  return (await readDay(today)) ?? (fetched ? readDay(fetched.date) : null);
}

function NotKept({ what }: { what: KeptThing }) {
  const language = useCrewLanguage();
  const words = phoneWords[language];
  return (
    <PhoneShell where={<b>{words.noSignal}</b>}>
      <div lang={language} className="p-3.5">
        <EmptyState
          title={words.notHere[what]}
          isPage
          action={
            <LinkButton size="thumb" href={paths.today()}>
              {titles[language].today}
            </LinkButton>
          }
        >
          {words.notOpenedHere}
        </EmptyState>
      </div>
    </PhoneShell>
  );
}

function NobodyHere() {
  const live = useLive('unsent', readUnsent);
  const language = useCrewLanguage();
  const words = phoneWords[language];
  const unsent = live.state === 'here' ? live.value.length : 0;
  return (
    <PhoneShell where={<b>{words.noSignal}</b>}>
      <div lang={language} className="p-3.5">
        <EmptyState title={words.nobody} isPage>
          {words.wantsSignal} {unsent > 0 ? words.keptForReader(unsent) : ''}
        </EmptyState>
      </div>
    </PhoneShell>
  );
}

function Opening() {
  return (
    <SkeletonScreen what="what this phone keeps">
      <div className="mx-auto flex max-w-phone flex-col gap-3 p-3.5">
        <Skeleton className="h-8 w-2/3" />
        <Skeleton className="h-16 w-full" />
        <Skeleton className="h-16 w-full" />
      </div>
    </SkeletonScreen>
  );
}
