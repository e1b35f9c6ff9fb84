'use client';

import type {
  DatesSetArg,
  EventClickArg,
  EventContentArg,
  EventDropArg,
  EventMountArg,
} from '@fullcalendar/core';
import dayGridPlugin from '@fullcalendar/daygrid';
import interactionPlugin, {
  type DropArg,
  type EventResizeDoneArg,
} from '@fullcalendar/interaction';
import momentTimezonePlugin from '@fullcalendar/moment-timezone';
import FullCalendar from '@fullcalendar/react';
import timeGridPlugin from '@fullcalendar/timegrid';
import { type RefObject, useMemo } from 'react';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { clockOf } from '@/lib/time/text-locale';
import type { WorkingPattern } from '@/lib/time/workdays';
import './diary-calendar.css';
import { diaryEvents, type EventDetail } from './diary-events';
import { useDiaryLocale } from './diary-locale';
import { reachByKey } from './reach-by-key';
import { VisitEvent, VisitLine } from './visit-event';

export type CalendarView = 'dayGridMonth' | 'timeGridWeek' | 'timeGridDay';

export type CalendarRange = { from: string; to: string; title: string; on: string };

type DiaryCalendarProps = {
  calendarRef: RefObject<FullCalendar | null>;
  zone: string;
  view: CalendarView;
  startOn: string;
  hours: WorkingPattern;
  visits: readonly VisitView[];
  crews: readonly CrewView[];
  /** What is only thought of: an opening that is looked at. */
  ghost: VisitView | null;
  mayBook: boolean;
  onRange: (range: CalendarRange) => void;
  onOpen: (visit: VisitView) => void;
  /** Dropped from the waiting list: local date, and time where the view has hours. */
  onDrop: (waitingKey: string, date: string, time: string | null) => void;
  onMove: (visit: VisitView, date: string, time: string, takeBack: () => void) => void;
  onStretch: (visit: VisitView, workMinutes: number, takeBack: () => void) => void;
};

// The calendar takes a new array, object or function for a changed option, and a changed option for a new
// range, which it tells the page, which renders it anew: all that never changes stands out here.
const plugins = [dayGridPlugin, timeGridPlugin, interactionPlugin, momentTimezonePlugin];
const clocks = {
  '12h': { hour: 'numeric', hour12: true },
  '24h': { hour: '2-digit', minute: '2-digit', hour12: false },
} as const;
/** For the days in its title (BCP 47); Europe's office reads English too. */
const localeOf = { US: 'en-US', UK: 'en-GB', AU: 'en-AU', EU: 'en-GB' } as const;
const views = {
  dayGridMonth: { dayHeaderFormat: { weekday: 'short' }, dayMaxEvents: 6, fixedWeekCount: false },
} as const;
const drawVisit = ({ event, view }: EventContentArg) => {
  const { visit, pieceNumber = 1, isGhost = false } = event.extendedProps as Partial<EventDetail>;
  // On its way from the waiting list it is no visit yet.
  if (!visit) return <div className="visit-box">{event.title}</div>;
  const detail = { visit, pieceNumber, isGhost };
  return view.type === 'dayGridMonth' ? (
    <VisitLine detail={detail} colour={event.borderColor} />
  ) : (
    <VisitEvent detail={detail} />
  );
};

/** Keys find the visit that has the focus by this. */
const nameVisit = ({ el, event }: EventMountArg) => {
  const { visit, isGhost } = event.extendedProps as Partial<EventDetail>;
  if (visit && !isGhost) el.dataset.visitId = visit.id;
};

export function DiaryCalendar(props: DiaryCalendarProps) {
  const { visits, crews, ghost, mayBook, hours } = props;
  const { region } = useDiaryLocale();
  // A new array at each render would snap a dragged visit back.
  const events = useMemo(
    () =>
      diaryEvents(ghost ? [...visits, ghost] : visits, crews, {
        mayMove: mayBook,
        ghostId: ghost?.id ?? null,
      }),
    [visits, crews, ghost, mayBook],
  );
  const businessHours = useMemo(
    () => ({
      daysOfWeek: hours.workdays.map((day) => day % 7),
      startTime: hours.dayStart,
      endTime: hours.dayEnd,
    }),
    [hours],
  );
  const daysOff = useMemo(() => hiddenDays(hours.workdays), [hours]);

  return (
    <FullCalendar
      ref={props.calendarRef}
      plugins={plugins}
      timeZone={props.zone}
      initialView={props.view}
      initialDate={props.startOn}
      headerToolbar={false}
      height="100%"
      firstDay={1}
      allDaySlot={false}
      nowIndicator
      slotEventOverlap={false}
      eventOrder="crewOrder,start"
      slotDuration="00:30:00"
      snapDuration="00:15:00"
      slotMinTime={hoursAround(hours.dayStart, -1)}
      slotMaxTime={hoursAround(hours.dayEnd, 3)}
      locale={localeOf[region]}
      slotLabelFormat={clocks[clockOf[region]]}
      views={views}
      dayHeaderFormat={dayHead}
      businessHours={businessHours}
      hiddenDays={daysOff}
      droppable={mayBook}
      events={events}
      eventInteractive
      dayCellDidMount={reachByKey}
      eventContent={drawVisit}
      eventClick={({ event, jsEvent }: EventClickArg) => {
        jsEvent.preventDefault();
        const { visit, isGhost } = event.extendedProps as EventDetail;
        if (!isGhost) props.onOpen(visit);
      }}
      drop={({ draggedEl, dateStr, allDay }: DropArg) => {
        const key = draggedEl.getAttribute('data-waiting');
        if (key) props.onDrop(key, dateStr.slice(0, 10), allDay ? null : dateStr.slice(11, 16));
      }}
      eventDrop={({ event, revert }: EventDropArg) => {
        const { visit } = event.extendedProps as EventDetail;
        props.onMove(visit, event.startStr.slice(0, 10), event.startStr.slice(11, 16), revert);
      }}
      eventResize={({ event, revert }: EventResizeDoneArg) => {
        const { visit } = event.extendedProps as EventDetail;
        const minutes = (Number(event.end) - Number(event.start)) / 60_000;
        props.onStretch(visit, minutes, revert);
      }}
      eventDidMount={nameVisit}
      datesSet={({ startStr, endStr, view }: DatesSetArg) =>
        props.onRange({
          from: startStr.slice(0, 10),
          to: endStr.slice(0, 10),
          title: view.title,
          on: view.calendar.formatIso(view.calendar.getDate()).slice(0, 10),
        })
      }
    />
  );
}

/** "Mon 30" for one day of the head; the month's head names weekdays only. */
function dayHead({ date }: { date: { year: number; month: number; day: number } }): string {
  const weekday = new Date(Date.UTC(date.year, date.month, date.day)).toLocaleDateString('en', {
    weekday: 'short',
    timeZone: 'UTC',
  });
  return `${weekday} ${date.day}`;
}

/** Weekends are folded away where the shop never works them. */
function hiddenDays(workdays: readonly number[]): number[] {
  return [6, 7].filter((day) => !workdays.includes(day)).map((day) => day % 7);
}

/** Whole hours before or after a local time, within the day: ("07:30", −1) is "06:00". */
function hoursAround(time: string, hours: number): string {
  const hour = Math.min(24, Math.max(0, Number(time.slice(0, 2)) + hours));
  return `${String(hour).padStart(2, '0')}:00:00`;
}
