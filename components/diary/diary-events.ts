import type { EventInput } from '@fullcalendar/core';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { crewColour } from './crew-colour';

export type EventDetail = { visit: VisitView; pieceNumber: number };

/** One event for each daily piece. Only the first carries the visit: the others follow where the work goes on. */
export function diaryEvents(
  visits: readonly VisitView[],
  crews: readonly CrewView[],
  shownCrewIds: ReadonlySet<string>,
  mayMove: boolean,
): EventInput[] {
  const colours = new Map(crews.map((crew) => [crew.id, crewColour(crew.colour)]));
  const crewOrder = new Map(crews.map((crew, index) => [crew.id, index]));
  return visits
    .filter((visit) => shownCrewIds.has(visit.crewId) && visit.status !== 'called-off')
    .flatMap((visit) =>
      visit.pieces.map((piece, index) => ({
        id: piece.id,
        start: piece.startsAt,
        end: piece.endsAt,
        title: `${visit.customerName}, ${visit.street}`,
        borderColor: colours.get(visit.crewId),
        backgroundColor: isOpen(visit) ? 'var(--paper)' : 'var(--sheet)',
        textColor: 'var(--ink)',
        crewOrder: crewOrder.get(visit.crewId),
        startEditable: mayMove && index === 0 && canMove(visit),
        durationEditable: mayMove && visit.pieces.length === 1 && canMove(visit),
        classNames: ['visit', isOpen(visit) ? 'visit-open' : 'visit-firm'],
        extendedProps: { visit, pieceNumber: index + 1 } satisfies EventDetail,
      })),
    );
}

const isOpen = (visit: VisitView) => visit.status === 'held' || visit.status === 'booked';
const canMove = (visit: VisitView) => isOpen(visit) || visit.status === 'confirmed';
