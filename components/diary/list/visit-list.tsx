'use client';

import { useDiaryLocale } from '@/components/diary/diary-locale';
import { EmptyState } from '@/components/ui/empty-state';
import { TitleBlock } from '@/components/ui/title-block';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { formatLocalDay } from '@/lib/time/format-civil';
import type { Zone } from '@/lib/time/zones';
import { listDays } from './list-days';
import './visit-list.css';
import { VisitRow } from './visit-row';

/** The visits one under the other, by day and time: whom to ring about tomorrow, and what was promised. */
export function VisitList({
  visits,
  crews,
  range,
  today,
  zone,
  onOpen,
}: {
  visits: readonly VisitView[];
  crews: readonly CrewView[];
  /** [from, to) as local dates. */
  range: { from: string; to: string };
  today: string;
  zone: Zone;
  onOpen: (visit: VisitView) => void;
}) {
  const locale = useDiaryLocale();
  const days = listDays(visits, range, zone);
  return (
    <section
      aria-label="List of visits"
      className="h-full overflow-y-auto border-t border-ink pt-2"
    >
      {days.length === 0 ? (
        <EmptyState title="No visit on these days">
          Go on by the arrow, or show again what is hidden above.
        </EmptyState>
      ) : null}
      {days.map(({ date, stands }) => (
        <section key={date} aria-labelledby={`list-${date}`} className="pb-4">
          <TitleBlock
            id={`list-${date}`}
            title={formatLocalDay(date, locale)}
            meta={date === today ? 'today' : stands.length}
          />
          <ul>
            {stands.map(({ visit, dayNumber }) => (
              <VisitRow
                key={visit.id}
                {...{ visit, dayNumber, zone, onOpen }}
                crew={crews.find(({ id }) => id === visit.crewId)}
              />
            ))}
          </ul>
        </section>
      ))}
    </section>
  );
}
