'use client';

import Link from 'next/link';
import { useHolder } from '@/components/phone/phone-person';
import { EmptyState } from '@/components/ui/empty-state';
import { TitleBlock } from '@/components/ui/title-block';
import type { TodayView, TodayVisit } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { formatLocalDay } from '@/lib/time/format-civil';
import { useCrew } from './crew-language';
import { VisitState } from './visit-state';
import { windowIn } from './visit-times';

/** The day's stops in order, with the drive to each. */
export function TodayList({ view }: { view: TodayView }) {
  const { visits, dayWords, date } = view;
  const { personName } = useHolder();
  const { language, region, words } = useCrew();
  const day = language === 'en' ? dayWords : formatLocalDay(date, { language, region });
  return (
    <section lang={language} className="px-3.5 py-4">
      <TitleBlock level={1} title={day} meta={`${personName} · ${words.stops(visits.length)}`} />
      {visits.length === 0 ? (
        <div className="pt-4">
          <EmptyState title={words.nothingToday}>{words.nothingTodayMore}</EmptyState>
        </div>
      ) : (
        <ol className="divide-y divide-rule border-b border-rule">
          {visits.map((visit, at) => (
            <li key={visit.id}>
              <Drive visit={visit} isFirst={at === 0} />
              <Stop visit={visit} />
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

/** How long it takes to get there from the stop before, or from the shop. */
function Drive({ visit, isFirst }: { visit: TodayVisit; isFirst: boolean }) {
  const { words } = useCrew();
  if (!visit.drive) return null;
  const { minutes, isEstimated } = visit.drive;
  return (
    <p className="pt-2 text-note text-graphite">
      <span aria-hidden="true">↓ </span>
      {words.drive(minutes, isEstimated)}
      {isFirst ? `, ${words.fromBase}` : ''}
    </p>
  );
}

function Stop({ visit }: { visit: TodayVisit }) {
  const { zone } = useHolder();
  const crew = useCrew();
  const { words, say } = crew;
  return (
    <Link
      href={paths.todayVisit(visit.id)}
      className="grid touch-manipulation grid-cols-[auto_1fr_auto] items-start gap-x-3 py-3 active:bg-tint"
    >
      <span className="w-[5.2rem] leading-tight font-bold">{windowIn(visit, crew, zone)}</span>
      <span className="min-w-0">
        <span className="block text-lead leading-tight font-bold">{visit.customerName}</span>
        <span className="block">
          {visit.street}
          {visit.town ? `, ${visit.town}` : ''}
        </span>
        <span className="block text-note text-graphite">
          {say(words.kinds[visit.kind])} · {visit.jobTitle}
        </span>
        <VisitState visit={visit} />
      </span>
      <span aria-hidden="true" className="self-center text-graphite">
        ›
      </span>
    </Link>
  );
}
