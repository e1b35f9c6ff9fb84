'use client';

import { useMemo, useRef } from 'react';
import { useCrewHours } from '@/components/diary/crew-hours-query';
import type { Place } from '@/components/diary/place';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import type { WorkingPattern } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import { pieceDates } from './board-bars';
import { boardDays } from './board-days';
import { BoardHead } from './board-head';
import { BoardRow } from './board-row';
import './crew-board.css';
import { useBoardDrag } from './use-board-drag';
import { useVisitPeek } from './use-visit-peek';
import { VisitPeek } from './visit-peek';

type CrewBoardProps = {
  zone: Zone;
  today: string;
  /** A Monday. */
  from: string;
  weeks: number;
  pattern: WorkingPattern;
  crews: readonly CrewView[];
  visits: readonly VisitView[];
  /** What is only thought of: an opening that is looked at. */
  ghost?: VisitView | null;
  mayBook: boolean;
  onOpen: (visit: VisitView) => void;
  onDay: (date: string) => void;
  onMove: (visit: VisitView, change: Partial<Place>) => void;
  onDropWaiting: (waitingKey: string, date: string, crewId: string) => void;
};

/** Crews down, days across: who is where, and how much of each crew's day is free. */
export function CrewBoard(props: CrewBoardProps) {
  const { zone, from, weeks, pattern, crews, visits, ghost, today } = props;
  const boardRef = useRef<HTMLElement>(null);
  const shown = useMemo(() => (ghost ? [...visits, ghost] : [...visits]), [visits, ghost]);
  const { hoursOf, elsewhereOf, workedDates } = useCrewHours({ from, weeks, pattern });
  const days = useMemo(() => {
    const visitDates = shown.flatMap((visit) => pieceDates(visit, zone));
    return boardDays({ from, weeks }, pattern, new Set([...visitDates, ...workedDates]));
  }, [shown, zone, from, weeks, pattern, workedDates]);
  useBoardDrag(boardRef, { ...props, days });
  const peek = useVisitPeek(boardRef);
  const peeked = peek ? visits.find(({ id }) => id === peek.visitId) : undefined;

  return (
    <section
      ref={boardRef}
      aria-label="Crews by day"
      className="crew-board"
      data-weeks={weeks}
      style={{ '--days': days.length } as React.CSSProperties}
    >
      <BoardHead days={days} today={today} onDay={props.onDay} />
      {crews.map((crew) => (
        <BoardRow
          key={crew.id}
          {...{ crew, days, zone, hoursOf, today, weeks }}
          elsewhere={elsewhereOf(crew.id)}
          ghostId={ghost?.id ?? null}
          visits={shown.filter(({ crewId }) => crewId === crew.id)}
          mayMove={props.mayBook}
          onOpen={props.onOpen}
        />
      ))}
      {peek && peeked ? <VisitPeek visit={peeked} bar={peek.bar} /> : null}
    </section>
  );
}
