'use client';

import { type RefObject, useEffect, useEffectEvent } from 'react';
import { canChange, type Place, placeOf } from '@/components/diary/place';
import { minutesWords } from '@/components/diary/visit-words';
import type { VisitView } from '@/lib/contracts/visits';
import type { WorkingPattern } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import type { BoardDay } from './board-days';
import { carry } from './carry';
import { timeInDay, workMinutesUntil } from './stretch-to';

type Dragging = {
  days: readonly BoardDay[];
  zone: Zone;
  pattern: WorkingPattern;
  visits: readonly VisitView[];
  mayBook: boolean;
  onMove: (visit: VisitView, change: Partial<Place>) => void;
  onDropWaiting: (waitingKey: string, date: string, crewId: string) => void;
};

type Taken =
  | { what: 'waiting'; key: string }
  | { what: 'visit' | 'edge'; visit: VisitView; column: number };

/**
 * Dragging on the board with a mouse or a pen: a visit to another day or crew, its right edge to another
 * end, a line of the waiting list onto a crew's day. A finger scrolls instead, and has the dialogs.
 */
export function useBoardDrag(boardRef: RefObject<HTMLElement | null>, dragging: Dragging): void {
  const cellAt = (x: number, y: number): HTMLElement | null => {
    const under = document.elementsFromPoint(x, y);
    const cell = under.find((element) => element.matches('[data-board-date]'));
    return cell instanceof HTMLElement && boardRef.current?.contains(cell) ? cell : null;
  };
  const columnOf = (cell: HTMLElement | null) =>
    dragging.days.findIndex(({ date }) => date === cell?.dataset.boardDate);

  const take = useEffectEvent((event: PointerEvent): Taken | null => {
    if (!dragging.mayBook || !(event.target instanceof Element)) return null;
    const key = event.target.closest('[data-waiting]')?.getAttribute('data-waiting');
    if (key) return event.target.closest('button') ? null : { what: 'waiting', key };
    const id = event.target.closest('[data-visit-id]')?.getAttribute('data-visit-id');
    const visit = dragging.visits.find((candidate) => candidate.id === id);
    if (!visit || !canChange(visit) || !boardRef.current?.contains(event.target)) return null;
    const column = columnOf(cellAt(event.clientX, event.clientY));
    return { what: event.target.closest('.board-stretch') ? 'edge' : 'visit', visit, column };
  });

  const stretched = (visit: VisitView, cell: HTMLElement, x: number) => {
    const { left, width } = cell.getBoundingClientRect();
    const end = {
      date: cell.dataset.boardDate ?? '',
      time: timeInDay((x - left) / width, dragging.pattern),
    };
    const minutes = workMinutesUntil(placeOf(visit, dragging.zone), end, dragging.pattern);
    return { end, minutes };
  };

  const words = useEffectEvent((taken: Taken, x: number, y: number): string => {
    const cell = cellAt(x, y);
    if (taken.what !== 'edge' || !cell) return '';
    const { end, minutes } = stretched(taken.visit, cell, x);
    return minutes > 0 ? `until ${end.time}: ${minutesWords(minutes)}` : 'too short';
  });

  const drop = useEffectEvent((taken: Taken, x: number, y: number) => {
    const cell = cellAt(x, y);
    const { boardDate = '', boardCrew: crewId = '' } = cell?.dataset ?? {};
    if (!cell) return;
    if (taken.what === 'waiting') return dragging.onDropWaiting(taken.key, boardDate, crewId);
    if (taken.what === 'edge') {
      const { minutes: workMinutes } = stretched(taken.visit, cell, x);
      if (workMinutes > 0) dragging.onMove(taken.visit, { workMinutes });
      return;
    }
    // Held by its third day, it is its third day that is put down here.
    const { date: startsOn } = placeOf(taken.visit, dragging.zone);
    const first = dragging.days.findIndex(({ date }) => date === startsOn);
    const landed = dragging.days[first + columnOf(cell) - taken.column]?.date ?? boardDate;
    dragging.onMove(taken.visit, { date: first === -1 ? boardDate : landed, crewId });
  });

  const cell = useEffectEvent(cellAt);

  useEffect(
    () =>
      carry({
        take: (event) => take(event),
        cellAt: (x, y) => cell(x, y),
        words: (taken, x, y) => words(taken, x, y),
        drop: (taken, x, y) => drop(taken, x, y),
      }),
    [],
  );
}
