import type { KeyboardEvent } from 'react';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { doesKind } from '@/lib/schedule/visit-kind-words';
import type { WorkingPattern } from '@/lib/time/workdays';
import { type Place, timeBeside, workdayBeside } from './place';

/** A step by key: what it does to a place. Null where the key does nothing here. */
type Step = (visit: VisitView, place: Place) => Place;

const stepMinutes = 30;

/** What moves and stretches the visit that has the focus: the hand's work without a hand. */
export const visitKeyWords = [
  { keys: 'Shift ←', words: 'The visit in focus: a working day earlier' },
  { keys: 'Shift →', words: 'The visit in focus: a working day later' },
  { keys: 'Shift ↑', words: 'The visit in focus: half an hour earlier' },
  { keys: 'Shift ↓', words: 'The visit in focus: half an hour later' },
  { keys: '+', words: 'The visit in focus: half an hour longer' },
  { keys: '-', words: 'The visit in focus: half an hour shorter' },
  { keys: 'X', words: 'The visit in focus: to the next crew that can' },
  { keys: 'O', words: 'The visit in focus: other times that work' },
  { keys: 'Y', words: 'The visit in focus: they said yes on the phone' },
] as const;

export function visitStep(
  { key, shiftKey }: Pick<KeyboardEvent, 'key' | 'shiftKey'>,
  shop: { pattern: WorkingPattern; crews: readonly CrewView[] },
): Step | null {
  const to =
    (change: (place: Place) => Partial<Place>): Step =>
    (_, place) => ({ ...place, ...change(place) });
  if (shiftKey && key === 'ArrowLeft')
    return to(({ date }) => ({ date: workdayBeside(date, -1, shop.pattern) }));
  if (shiftKey && key === 'ArrowRight')
    return to(({ date }) => ({ date: workdayBeside(date, 1, shop.pattern) }));
  if (shiftKey && key === 'ArrowUp')
    return to(({ time }) => ({ time: timeBeside(time, -stepMinutes) }));
  if (shiftKey && key === 'ArrowDown')
    return to(({ time }) => ({ time: timeBeside(time, stepMinutes) }));
  if (key === '+' || key === '=')
    return to(({ workMinutes }) => ({ workMinutes: workMinutes + stepMinutes }));
  if (key === '-')
    return to(({ workMinutes }) => ({
      workMinutes: Math.max(stepMinutes, workMinutes - stepMinutes),
    }));
  if (key.toLowerCase() === 'x')
    return (visit, place) => ({ ...place, crewId: nextCrew(visit, place, shop.crews) });
  return null;
}

function nextCrew(visit: VisitView, place: Place, crews: readonly CrewView[]): string {
  const able = crews.filter(({ does }) => does === doesKind[visit.kind]);
  const at = able.findIndex(({ id }) => id === place.crewId);
  return able[(at + 1) % able.length]?.id ?? place.crewId;
}

/**
 * The next visit on the screen in a direction, to give the focus to: the nearest one that lies that way,
 * sideways distance counting double.
 */
export function visitBeside(from: HTMLElement, key: string, within: HTMLElement) {
  const way = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, -1], ArrowDown: [0, 1] }[key];
  const [x = 0, y = 0] = way ?? [];
  if (!way) return null;
  const start = middle(from);
  let best: { element: HTMLElement; distance: number } | null = null;
  for (const element of within.querySelectorAll<HTMLElement>('[data-visit-id]')) {
    const at = middle(element);
    const ahead = (at.x - start.x) * x + (at.y - start.y) * y;
    const aside = Math.abs((at.x - start.x) * y) + Math.abs((at.y - start.y) * x);
    const distance = ahead + 2 * aside;
    if (element !== from && ahead > 1 && (!best || distance < best.distance))
      best = { element, distance };
  }
  return best?.element ?? null;
}

function middle(element: HTMLElement) {
  const { left, top, width, height } = element.getBoundingClientRect();
  return { x: left + Math.min(width, 60) / 2, y: top + Math.min(height, 30) / 2 };
}
