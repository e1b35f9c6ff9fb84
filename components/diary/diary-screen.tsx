'use client';

import type FullCalendar from '@fullcalendar/react';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { usePageKeys } from '@/components/shell/page-keys';
import { ErrorState } from '@/components/ui/error-state';
import type { CrewView, VisitView, WaitingItem } from '@/lib/contracts/visits';
import { BookDialog } from './book-dialog';
import { CrewKey } from './crew-key';
import { DiaryCalendar, type DiaryView } from './diary-calendar';
import { DiaryHead } from './diary-head';
import { localStart } from './local-start';
import { useMovedByHand } from './use-moved-by-hand';
import { useShownCrews } from './use-shown-crews';
import { VisitDialog } from './visit-dialog';
import { useVisits } from './visits-query';
import { WaitingList } from './waiting-list';
import { waitingQuery } from './waiting-query';

export type DiaryScreenProps = {
  zone: string;
  /** Local date to open on, today unless the address says otherwise. */
  startOn: string;
  hours: { dayStart: string; dayEnd: string; workdays: number[] };
  crews: CrewView[];
  mayBook: boolean;
};

type Booking = { item: WaitingItem; date: string; time: string };

/** The diary beside its waiting list: the scheduler's whole screen. */
export function DiaryScreen({ zone, startOn, hours, crews, mayBook }: DiaryScreenProps) {
  const calendarRef = useRef<FullCalendar>(null);
  const [range, setRange] = useState({ from: startOn, to: startOn, title: '' });
  const [view, setView] = useState<DiaryView>('timeGridWeek');
  const [opened, setOpened] = useState<VisitView | null>(null);
  const [booking, setBooking] = useState<Booking | null>(null);
  const { shownCrewIds, toggle } = useShownCrews(crews);
  const { data: visits = [], error } = useVisits(range);
  const client = useQueryClient();
  const startOf = (visit: VisitView) => localStart(visit.startsAt, zone);
  const moveByHand = useMovedByHand(startOf);

  const calendar = () => calendarRef.current?.getApi();
  const show = (next: DiaryView) => calendar()?.changeView(next);
  const waiting = () => client.getQueryData(waitingQuery.queryKey) ?? [];
  const openBooking = (item: WaitingItem, date?: string, time?: string | null) =>
    setBooking({
      item,
      date: date ?? (item.from && item.from > startOn ? item.from : startOn),
      time: time ?? hours.dayStart,
    });

  usePageKeys('Diary', [
    { keys: 'ArrowLeft', words: 'Earlier', run: () => calendar()?.prev() },
    { keys: 'ArrowRight', words: 'Later', run: () => calendar()?.next() },
    { keys: 't', words: 'Today', run: () => calendar()?.gotoDate(startOn) },
    { keys: 'm', words: 'Month', run: () => show('dayGridMonth') },
    { keys: 'w', words: 'Week', run: () => show('timeGridWeek') },
    { keys: 'd', words: 'Day', run: () => show('timeGridDay') },
    ...[1, 2, 3, 4, 5, 6, 7, 8, 9].map((digit) => ({
      keys: String(digit),
      words: `Book number ${digit} of the waiting list`,
      run: () => {
        const item = waiting()[digit - 1];
        if (item && mayBook) openBooking(item);
      },
    })),
  ]);

  // A phone has room for one day.
  useEffect(() => {
    if (window.innerWidth < 768)
      queueMicrotask(() => calendarRef.current?.getApi().changeView('timeGridDay'));
  }, []);

  return (
    <div className="grid gap-6 lg:h-[calc(100dvh-2rem)] lg:grid-cols-[minmax(0,1fr)_20rem]">
      <section aria-label="Diary" className="flex min-h-[70dvh] min-w-0 flex-col lg:min-h-0">
        <DiaryHead
          title={range.title}
          view={view}
          onView={show}
          onEarlier={() => calendar()?.prev()}
          onToday={() => calendar()?.gotoDate(startOn)}
          onLater={() => calendar()?.next()}
        />
        <CrewKey crews={crews} shownCrewIds={shownCrewIds} onToggle={toggle} />
        {error ? (
          <ErrorState title="The diary could not be fetched">
            What is shown may be old. It is tried again by itself.
          </ErrorState>
        ) : null}
        <div className="min-h-0 flex-1">
          <DiaryCalendar
            {...{ calendarRef, zone, view, startOn, hours, visits, crews, shownCrewIds, mayBook }}
            onRange={({ from, to, title, view: shown }) =>
              queueMicrotask(() => {
                setRange((shownNow) =>
                  shownNow.from === from && shownNow.to === to && shownNow.title === title
                    ? shownNow
                    : { from, to, title },
                );
                setView(shown);
              })
            }
            onOpen={setOpened}
            onDrop={(key, date, time) => {
              const item = waiting().find(({ jobId, kind }) => `${jobId}/${kind}` === key);
              if (item) openBooking(item, date, time);
            }}
            onMove={(visit, date, time, takeBack) =>
              void moveByHand(visit, { date, time, workMinutes: visit.workMinutes }, takeBack)
            }
            onStretch={(visit, workMinutes, takeBack) =>
              void moveByHand(visit, { ...startOf(visit), workMinutes }, takeBack)
            }
          />
        </div>
      </section>
      <aside className="flex min-h-0 flex-col border-rule lg:border-l lg:pl-5">
        <WaitingList mayBook={mayBook} onBook={openBooking} />
      </aside>
      {booking ? (
        <BookDialog
          item={booking.item}
          crews={crews}
          start={booking}
          onClose={() => setBooking(null)}
          onBooked={(date) => {
            setBooking(null);
            calendar()?.gotoDate(date);
          }}
        />
      ) : null}
      {opened ? (
        <VisitDialog
          visit={opened}
          start={startOf(opened)}
          crews={crews}
          mayBook={mayBook}
          onClose={() => setOpened(null)}
        />
      ) : null}
    </div>
  );
}
