'use client';

import { useMemo } from 'react';
import { TitleBlock } from '@/components/ui/title-block';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { proveRoom } from '@/lib/measure/prove-room';
import type { Queued } from '@/lib/sync/queued';
import { isOpen } from '@/lib/walls-pad/next-ask';
import { placeHref } from './book-place';
import { FractionWords } from './fraction-words';
import { HandIn } from './hand-in';
import { LineLink } from './line-link';
import { PlaceButton } from './place-button';
import { RoomFrame } from './room-frame';
import { RoomProof } from './room-proof';

type LeaveScreenProps = { view: WallBookView; plan: PlannedReading[]; queue: Queued[] };

/** Before the van leaves: what is missing and why, what disagrees, and handing the book in. */
export function LeaveScreen({ view, plan, queue }: LeaveScreenProps) {
  const { wallBook, runs, rules } = view;
  const fit = useMemo(() => proveRoom(wallBook, runs, rules), [wallBook, runs, rules]);
  const must = plan.filter((each) => isOpen(each) && each.need === 'must');
  const should = plan.filter((each) => isOpen(each) && each.need === 'should');
  const skipped = plan.filter(({ takenBy, skipped }) => takenBy.length === 0 && skipped);
  return (
    <RoomFrame title="Before you leave" meta={wallBook.room.name}>
      <RoomProof fit={fit} view={view} plan={plan} />
      <Missing
        title="Must be read"
        meta={must.length === 0 ? 'nothing' : `${must.length} to go`}
        planned={must}
        emptyWords="Every reading that a cut size hangs on is in the book."
      />
      {should.length > 0 ? (
        <details>
          <summary className="min-h-thumb py-3 font-medium">
            {should.length} more would make it surer
          </summary>
          <Missing title="Surer with" meta={`${should.length} to go`} planned={should} />
        </details>
      ) : null}
      {skipped.length > 0 ? (
        <section>
          <TitleBlock title="Not taken, with a reason" />
          <ul className="divide-y divide-rule">
            {skipped.map(({ slot, words, skipped: skip }) => (
              <li key={slot}>
                <LineLink href={placeHref({ at: 'ask', slot })} note={skip?.reason} value="take it">
                  <FractionWords>{words}</FractionWords>
                </LineLink>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      <HandIn view={view} mustCount={must.length} queue={queue} />
      <PlaceButton look="plain" place={{ at: 'list' }}>
        The whole room
      </PlaceButton>
    </RoomFrame>
  );
}

function Missing({
  title,
  meta,
  planned,
  emptyWords,
}: {
  title: string;
  meta: string;
  planned: PlannedReading[];
  emptyWords?: string;
}) {
  return (
    <section>
      <TitleBlock title={title} meta={meta} />
      {planned.length === 0 && emptyWords ? <p className="py-2">{emptyWords}</p> : null}
      <ul className="divide-y divide-rule">
        {planned.map(({ slot, words, why }) => (
          <li key={slot}>
            <LineLink
              href={placeHref({ at: 'ask', slot })}
              note={<FractionWords>{why}</FractionWords>}
            >
              <FractionWords>{words}</FractionWords>
            </LineLink>
          </li>
        ))}
      </ul>
    </section>
  );
}
