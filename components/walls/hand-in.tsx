'use client';

import { useState } from 'react';
import { usePersonId } from '@/components/phone/phone-person';
import { keepWork } from '@/components/phone/queue-store';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Queued } from '@/lib/sync/queued';

type HandInProps = { view: WallBookView; mustCount: number; queue: Queued[] };

/** Tells the office that the book is full; from here on it is theirs to work with. */
export function HandIn({ view, mustCount, queue }: HandInProps) {
  const personId = usePersonId();
  const [problem, setProblem] = useState<string | null>(null);
  const roomId = view.wallBook.room.id;
  const waits = queue.some(({ work }) => work.kind === 'submit');
  const unsent = queue.filter(({ work }) => work.kind === 'reading').length;
  const handIn = async () => {
    try {
      await keepWork(personId, [{ kind: 'submit', roomId }]);
    } catch {
      setProblem('This phone could not keep it. Free some space and try again.');
    }
  };
  return (
    <section className="flex flex-col gap-3">
      <TitleBlock title="Hand it in" meta={stateWords(view.submittedAt, waits)} />
      {mustCount > 0 ? (
        <p className="border-l-4 border-ochre bg-tint px-3 py-2">
          {mustCount === 1
            ? 'One reading that a cut size hangs on is'
            : `${mustCount} readings that cut sizes hang on are`}{' '}
          missing: the bench cannot cut by this book yet. It can be handed in all the same.
        </p>
      ) : null}
      {problem ? (
        <p role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2">
          {problem}
        </p>
      ) : null}
      <Button size="thumb" onClick={handIn} disabled={waits}>
        {view.submittedAt ? 'Hand it in again' : 'Hand the wall book in'}
      </Button>
      {waits || unsent > 0 ? (
        <p className="text-note text-graphite">
          Saved here. It goes to the office by itself, after the readings, as soon as there is a
          signal.
        </p>
      ) : null}
    </section>
  );
}

function stateWords(submittedAt: string | null, waits: boolean): string {
  if (waits) return 'waits to be sent';
  if (!submittedAt) return 'not yet';
  const when = new Date(submittedAt).toLocaleString(undefined, {
    weekday: 'short',
    hour: '2-digit',
    minute: '2-digit',
  });
  return `handed in ${when}`;
}
