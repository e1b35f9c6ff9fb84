'use client';

import type { ReactNode } from 'react';
import { TitleBlock } from '@/components/ui/title-block';
import { Verdict } from '@/components/ui/verdict';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { useCrew } from './crew-language';
import { type StopPlace, stopHref } from './stop-place';

const setsCabinets = new Set(['install', 'return', 'delivery', 'worktop-template']);

/** What is done at a stop, each thing one large line with how it stands. */
export function StopMenu({ visit, stop }: { visit: TodayVisit; stop: StopView }) {
  const { words } = useCrew();
  const answered = stop.checklist.filter(({ key }) =>
    stop.checks.some(({ item }) => item === key),
  ).length;
  const open = stop.snags.filter(({ closedAt }) => closedAt === null).length;
  const sets = setsCabinets.has(visit.kind);
  return (
    <section>
      <TitleBlock title={words.work} meta={visit.jobTitle} />
      {sets && stop.sheets.length === 0 ? (
        <p className="border-l-4 border-ochre bg-tint px-3 py-2">{words.noSheet}</p>
      ) : null}
      <ul className="divide-y divide-rule border-b border-rule">
        {stop.sheets.length > 0 ? <Line place={{ at: 'bring' }}>{words.bring}</Line> : null}
        {stop.sheets.map(({ wallBook, roomName, release, supersededBy, newerRevision }) => (
          <Line
            key={wallBook.room.id}
            place={{ at: 'setting', roomId: wallBook.room.id }}
            meta={
              supersededBy.length > 0 || newerRevision ? (
                <Verdict kind="over">{words.revision(release.revision)}</Verdict>
              ) : (
                words.revision(release.revision)
              )
            }
          >
            {words.setting}: {roomName}
          </Line>
        ))}
        {stop.sheets.map(({ wallBook, roomName }) => (
          <Line
            key={`as-found ${wallBook.room.id}`}
            place={{ at: 'as-found', roomId: wallBook.room.id }}
            meta={<AsFoundState stop={stop} roomId={wallBook.room.id} />}
          >
            {words.asFound}
            {stop.sheets.length > 1 ? `: ${roomName}` : ''}
          </Line>
        ))}
        {stop.checklist.length > 0 ? (
          <Line place={{ at: 'checks' }} meta={words.checked(answered, stop.checklist.length)}>
            {words.checklist}
          </Line>
        ) : null}
        <Line place={{ at: 'snags' }} meta={words.open(open)}>
          {words.snags}
        </Line>
        {sets ? <Line place={{ at: 'new-snag', kind: 'short' }}>{words.partShort}</Line> : null}
        {sets ? (
          <Line
            place={{ at: 'sign' }}
            meta={stop.signOff ? <Verdict kind="confirmed">{words.signed}</Verdict> : null}
          >
            {words.signOff}
          </Line>
        ) : null}
      </ul>
    </section>
  );
}

function AsFoundState({ stop, roomId }: { stop: StopView; roomId: string }) {
  const last = stop.asFound.filter((one) => one.roomId === roomId).at(-1);
  if (!last) return null;
  return <Verdict kind={last.disagreements.length === 0 ? 'within' : 'over'}> </Verdict>;
}

type LineProps = { place: StopPlace; meta?: ReactNode; children: ReactNode };

function Line({ place, meta, children }: LineProps) {
  return (
    <li>
      <a
        href={stopHref(place)}
        className="flex min-h-thumb touch-manipulation items-center justify-between gap-3 py-2 text-lead active:bg-tint"
      >
        <span>{children}</span>
        <span className="flex shrink-0 items-center gap-2 text-note text-graphite">
          {meta}
          <span aria-hidden="true">›</span>
        </span>
      </a>
    </li>
  );
}
