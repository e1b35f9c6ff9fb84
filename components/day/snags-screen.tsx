'use client';

import { buttonLook } from '@/components/ui/button-look';
import { EmptyState } from '@/components/ui/empty-state';
import { Verdict } from '@/components/ui/verdict';
import type { SnagView } from '@/lib/contracts/snags';
import type { StopView } from '@/lib/contracts/stops';
import { useCrew } from './crew-language';
import { ScreenFrame } from './screen-frame';
import { snagFacts } from './snag-facts';
import { stopHref } from './stop-place';

/** Every snag of the job: the open ones first, so that a return visit finds them together. */
export function SnagsScreen({ stop }: { stop: StopView }) {
  const { words } = useCrew();
  const open = stop.snags.filter(({ closedAt }) => closedAt === null);
  const closed = stop.snags.filter(({ closedAt }) => closedAt !== null);
  return (
    <ScreenFrame title={words.snags} meta={words.open(open.length)}>
      <a href={stopHref({ at: 'new-snag', kind: 'fault' })} className={buttonLook('fill', 'thumb')}>
        {words.newSnag}
      </a>
      {stop.snags.length === 0 ? (
        <EmptyState title={words.noSnags}>{words.noSnagsMore}</EmptyState>
      ) : (
        <ul className="divide-y divide-rule border-b border-rule">
          {[...open, ...closed].map((snag) => (
            <SnagLine key={snag.id} snag={snag} />
          ))}
        </ul>
      )}
    </ScreenFrame>
  );
}

function SnagLine({ snag }: { snag: SnagView }) {
  const crew = useCrew();
  const { words } = crew;
  return (
    <li>
      <a
        href={stopHref({ at: 'snag', snagId: snag.id })}
        className="flex min-h-thumb touch-manipulation items-start justify-between gap-3 py-3 active:bg-tint"
      >
        <span>
          <span className="block text-lead leading-tight font-bold">{snag.words}</span>
          <span className="block">{snagFacts(snag, crew)}</span>
          {snag.benchSays ? <span className="block">{words.benchSays(snag.benchSays)}</span> : null}
        </span>
        <span className="flex shrink-0 items-center gap-2">
          {snag.closedAt ? (
            <Verdict kind="confirmed">{words.closed}</Verdict>
          ) : snag.isLate ? (
            <Verdict kind="late" />
          ) : null}
          <span aria-hidden="true">›</span>
        </span>
      </a>
    </li>
  );
}
