import { useMutation, useQueryClient } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type {
  BookVisitInput,
  CallOffVisitInput,
  MoveVisitInput,
  NoteYesInput,
  VisitView,
} from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { visitsKey } from './visits-query';
import { waitingKey } from './waiting-query';

/** After a change the diary and the waiting list are fetched anew: the server has the last word on both. */
function useDiaryChange<Input>(send: (input: Input) => Promise<VisitView>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: visitsKey }),
        client.invalidateQueries({ queryKey: waitingKey }),
      ]),
  });
}

export const useBookVisit = () =>
  useDiaryChange((input: BookVisitInput) =>
    askServer<VisitView>(apiPaths.visits(), { body: input }),
  );

export const useMoveVisit = () =>
  useDiaryChange(({ visitId, ...body }: MoveVisitInput) =>
    askServer<VisitView>(apiPaths.visit(visitId), { method: 'PATCH', body }),
  );

export const useCallOffVisit = () =>
  useDiaryChange(({ visitId, ...body }: CallOffVisitInput) =>
    askServer<VisitView>(apiPaths.callOffVisit(visitId), { body }),
  );

export const useNoteYes = () =>
  useDiaryChange(({ visitId, ...body }: NoteYesInput) =>
    askServer<VisitView>(apiPaths.noteYes(visitId), { body }),
  );
