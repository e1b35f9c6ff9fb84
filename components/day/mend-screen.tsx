'use client';

import { EmptyState } from '@/components/ui/empty-state';
import { Verdict } from '@/components/ui/verdict';
import type { CrewSnag } from '@/lib/contracts/snags';
import { useCrew } from './crew-language';
import { MendWhere } from './mend-where';
import { ScreenFrame } from './screen-frame';
import { snagFacts } from './snag-facts';
import { stopHref } from './stop-place';

/** What the crew has to mend on all its jobs, the most pressing first; one tap opens one. */
export function MendScreen({ snags }: { snags: readonly CrewSnag[] }) {
  const crew = useCrew();
  const { words } = crew;
  return (
    <ScreenFrame title={words.toMend} meta={words.open(snags.length)}>
      {snags.length === 0 ? (
        <EmptyState title={words.nothingToMend}>{words.nothingToMendMore}</EmptyState>
      ) : (
        <ul className="divide-y divide-rule border-b border-rule">
          {snags.map((snag) => (
            <li key={snag.id}>
              <a
                href={stopHref({ at: 'snag', snagId: snag.id })}
                className="flex min-h-thumb touch-manipulation items-start justify-between gap-3 py-3 active:bg-tint"
              >
                <span>
                  <span className="block text-lead leading-tight font-bold">{snag.words}</span>
                  <MendWhere snag={snag} />
                  <span className="block">{snagFacts(snag, crew)}</span>
                  {snag.benchSays ? (
                    <span className="block">{words.benchSays(snag.benchSays)}</span>
                  ) : null}
                </span>
                <span className="flex shrink-0 items-center gap-2">
                  {snag.isLate ? <Verdict kind="late">{words.late}</Verdict> : null}
                  <span aria-hidden="true">›</span>
                </span>
              </a>
            </li>
          ))}
        </ul>
      )}
    </ScreenFrame>
  );
}
