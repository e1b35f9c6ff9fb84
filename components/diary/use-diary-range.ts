'use client';

import type FullCalendar from '@fullcalendar/react';
import { useEffect, useRef, useState } from 'react';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { formatLocalDay } from '@/lib/time/format-civil';
import type { TextLocale } from '@/lib/time/text-locale';
import { mondayOf } from './board/board-days';
import type { CalendarRange } from './diary-calendar';
import { boardTitle } from './diary-title';
import type { ShownView } from './diary-view';

/** The list begins on any day, and goes on for two weeks. */
const listedDays = 14;

export type DiaryRange = ReturnType<typeof useDiaryRange>;

/** Which days are shown, whether by the crews' board or by the calendar, and how to get to others. */
export function useDiaryRange(startOn: LocalDate, shown: ShownView, locale: TextLocale) {
  const calendarRef = useRef<FullCalendar>(null);
  const [on, setOn] = useState(startOn);
  const [calendarRange, setCalendarRange] = useState<CalendarRange | null>(null);
  const isBoard = shown.view === 'crews';
  const isList = shown.view === 'list';
  const monday = mondayOf(on);
  const calendarView = {
    crews: null,
    list: null,
    month: 'dayGridMonth',
    week: 'timeGridWeek',
    day: 'timeGridDay',
  }[shown.view];

  // The calendar keeps its own date and view; it is told of ours, after React has drawn.
  useEffect(() => {
    if (!calendarView) return;
    queueMicrotask(() => {
      const api = calendarRef.current?.getApi();
      if (api && api.view.type !== calendarView) api.changeView(calendarView);
    });
  }, [calendarView]);

  const board = {
    from: monday,
    to: addDays(monday, shown.weeks * 7),
    title: boardTitle(monday, shown.weeks, locale),
  };
  const list = {
    from: on,
    to: addDays(on, listedDays),
    title: `From ${formatLocalDay(on, locale)}`,
  };
  return {
    calendarRef,
    on,
    ...(isList ? list : isBoard || !calendarRange ? board : calendarRange),
    /** The calendar shows other days. */
    heard: (range: CalendarRange) =>
      queueMicrotask(() => {
        setCalendarRange((now) =>
          now?.from === range.from && now.to === range.to && now.title === range.title
            ? now
            : range,
        );
        setOn(range.on);
      }),
    goTo: (date: LocalDate) => {
      setOn(date);
      // The calendar draws at once, which it cannot while React does.
      queueMicrotask(() => calendarRef.current?.getApi().gotoDate(date));
    },
    step: (way: 1 | -1) => {
      const api = calendarRef.current?.getApi();
      if (isList) setOn(addDays(on, way));
      else if (isBoard || !api) setOn(addDays(on, way * 7 * shown.weeks));
      else if (way === 1) api.next();
      else api.prev();
    },
  };
}
