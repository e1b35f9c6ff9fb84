import { problemOf } from '@/components/shell/ask-server';
import { showToast } from '@/components/ui/toast-store';
import type { VisitView } from '@/lib/contracts/visits';
import { useMoveVisit } from './change-visit-query';

type Place = { date: string; time: string; workMinutes: number };

/** A visit dragged or stretched: sent at once, ten seconds to undo, put back where the server refuses. */
export function useMovedByHand(startOf: (visit: VisitView) => { date: string; time: string }) {
  const move = useMoveVisit();

  return async (visit: VisitView, to: Place, takeBack: () => void) => {
    const from: Place = { ...startOf(visit), workMinutes: visit.workMinutes };
    const send = (version: number, place: Place) =>
      move.mutateAsync({
        visitId: visit.id,
        version,
        crewId: visit.crewId,
        ...place,
        overrideReason: '',
      });
    const tell = (caught: unknown) => {
      const { title, detail } = problemOf(caught);
      showToast({ text: detail ? `${title}. ${detail}` : title, isProblem: true });
    };
    try {
      const moved = await send(visit.version, to);
      showToast({
        text: `${moved.customerName}: ${moved.dayWords}, ${moved.windowWords}`,
        undo: () => void send(moved.version, from).catch(tell),
      });
    } catch (caught) {
      takeBack();
      tell(caught);
    }
  };
}
