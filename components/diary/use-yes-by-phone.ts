'use client';

import { sayProblem } from '@/components/shell/say-problem';
import { showToast } from '@/components/ui/toast-store';
import type { VisitView } from '@/lib/contracts/visits';
import { useNoteYes } from './change-visit-query';
import { useTakeBack } from './use-take-back';

/** Notes the yes that a customer said on the phone: they are not asked again. */
export function useYesByPhone() {
  const note = useNoteYes();
  const takeBack = useTakeBack();
  return async ({ id, version, customerName }: VisitView) => {
    try {
      const said = await note.mutateAsync({ visitId: id, version });
      showToast({
        text: `${customerName} said yes. They are not asked again.`,
        undo: () => void takeBack(said),
      });
    } catch (caught) {
      sayProblem(caught);
    }
  };
}
