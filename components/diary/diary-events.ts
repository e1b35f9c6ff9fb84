import type { EventInput } from '@fullcalendar/core';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { crewColour } from './crew-colour';
import { canChange, isOpen } from './place';

export type EventDetail = { visit: VisitView; pieceNumber: number; isGhost: boolean };

/** One event for each daily piece. Only the first carries the visit: the others follow where the work goes on. */
export function diaryEvents(
  visits: readonly VisitView[],
  crews: readonly CrewView[],
  { mayMove, ghostId }: { mayMove: boolean; ghostId: string | null },
): EventInput[] {
  const colours = new Map(crews.map((crew) => [crew.id, crewColour(crew.colour)]));
  const crewOrder = new Map(crews.map((crew, index) => [crew.id, index]));
  return visits.flatMap((visit) => {
    const isGhost = visit.id === ghostId;
    const isMovable = mayMove && canChange(visit) && !isGhost;
    return visit.pieces.map((piece, index) => ({
      id: piece.id,
      start: piece.startsAt,
      end: piece.endsAt,
      title: `${visit.customerName}, ${visit.street}`,
      borderColor: isGhost ? 'var(--blueprint)' : colours.get(visit.crewId),
      backgroundColor: isGhost
        ? 'color-mix(in srgb, var(--blueprint) 14%, var(--sheet))'
        : isOpen(visit)
          ? 'var(--paper)'
          : 'var(--sheet)',
      textColor: 'var(--ink)',
      crewOrder: crewOrder.get(visit.crewId),
      startEditable: isMovable && index === 0,
      durationEditable: isMovable && visit.pieces.length === 1,
      classNames: ['visit', isGhost ? 'visit-ghost' : isOpen(visit) ? 'visit-open' : 'visit-firm'],
      extendedProps: { visit, pieceNumber: index + 1, isGhost } satisfies EventDetail,
    }));
  });
}
