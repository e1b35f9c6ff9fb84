'use client';

import { type KeyboardEvent, useEffect, useState } from 'react';
import { flushSync } from 'react-dom';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import type { WorkingPattern } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import { mondayOf } from './board/board-days';
import { CrewBoard } from './board/crew-board';
import { DiaryCalendar } from './diary-calendar';
import type { ShownView } from './diary-view';
import { VisitList } from './list/visit-list';
import { localStart } from './local-start';
import type { Place } from './place';
import type { DiaryRange } from './use-diary-range';

type DiarySheetProps = {
  zone: Zone;
  today: string;
  pattern: WorkingPattern;
  shown: ShownView;
  range: DiaryRange;
  crews: readonly CrewView[];
  shownCrews: readonly CrewView[];
  visits: readonly VisitView[];
  ghost: VisitView | null;
  mayBook: boolean;
  onVisitKey: (event: KeyboardEvent<HTMLElement>) => void;
  onOpen: (visit: VisitView) => void;
  onDay: (date: string) => void;
  onMove: (visit: VisitView, change: Partial<Place>) => Promise<boolean>;
  onDropWaiting: (key: string, at: { date: string; time?: string; crewId?: string }) => void;
};

/**
 * The days themselves: by crew on our board, by month, week and day on the calendar, or one under the other as a
 * list. On paper by crew, but for the list.
 */
export function DiarySheet(props: DiarySheetProps) {
  const { zone, pattern, shown, range, crews, visits, ghost, mayBook } = props;
  const isPrinted = useIsPrinted();
  const { view } = shown;
  const isBoard = view === 'crews';
  const isList = view === 'list';
  const board = (
    <CrewBoard
      {...{ zone, pattern, visits, mayBook, ghost }}
      today={props.today}
      from={mondayOf(isBoard ? range.from : range.on)}
      weeks={isBoard ? shown.weeks : 1}
      crews={props.shownCrews}
      onOpen={props.onOpen}
      onDay={props.onDay}
      onMove={(visit, change) => void props.onMove(visit, change)}
      onDropWaiting={(key, date, crewId) => props.onDropWaiting(key, { date, crewId })}
    />
  );
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: it only hears the keys pressed on the visits within
    <div className="min-h-0 flex-1" onKeyDown={props.onVisitKey}>
      {isBoard ? board : null}
      {isList ? (
        <VisitList {...{ visits, crews, range, zone }} today={props.today} onOpen={props.onOpen} />
      ) : null}
      {isBoard || isList ? null : (
        <div className="h-full print:hidden">
          <DiaryCalendar
            {...{ zone, visits, crews, ghost, mayBook }}
            calendarRef={range.calendarRef}
            view={calendarViews[view]}
            startOn={range.on}
            hours={pattern}
            onRange={range.heard}
            onOpen={props.onOpen}
            onDrop={(key, date, time) =>
              props.onDropWaiting(key, { date, ...(time ? { time } : {}) })
            }
            onMove={async (visit, date, time, takeBack) => {
              if (
                !(await props.onMove(visit, {
                  date,
                  time: time || localStart(visit.startsAt, zone).time,
                }))
              )
                takeBack();
            }}
            onStretch={async (visit, workMinutes, takeBack) => {
              if (!(await props.onMove(visit, { workMinutes }))) takeBack();
            }}
          />
        </div>
      )}
      {isPrinted && !isBoard && !isList ? <div className="hidden print:block">{board}</div> : null}
    </div>
  );
}

const calendarViews = {
  month: 'dayGridMonth',
  week: 'timeGridWeek',
  day: 'timeGridDay',
} as const;

/** True from the moment that the browser makes its printed pages. */
function useIsPrinted(): boolean {
  const [isPrinted, setIsPrinted] = useState(false);
  useEffect(() => {
    const begin = () => flushSync(() => setIsPrinted(true));
    const end = () => setIsPrinted(false);
    window.addEventListener('beforeprint', begin);
    window.addEventListener('afterprint', end);
    return () => {
      window.removeEventListener('beforeprint', begin);
      window.removeEventListener('afterprint', end);
    };
  }, []);
  return isPrinted;
}
