import Link from 'next/link';
import { EmptyState } from '@/components/ui/empty-state';
import { TitleBlock } from '@/components/ui/title-block';
import type { TodayView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { VisitState } from './visit-state';

/** The day's stops in order. */
export function TodayList({ view, personName }: { view: TodayView; personName: string }) {
  const { visits, dayWords } = view;
  return (
    <section className="px-3.5 py-4">
      <TitleBlock level={1} title={dayWords} meta={`${personName} · ${stopWords(visits.length)}`} />
      {visits.length === 0 ? (
        <div className="pt-4">
          <EmptyState title="Nothing booked for you today">
            When the office books a visit, it stands here.
          </EmptyState>
        </div>
      ) : (
        <ol className="divide-y divide-rule border-b border-rule">
          {visits.map((visit) => (
            <li key={visit.id}>
              <Link
                href={paths.todayVisit(visit.id)}
                className="grid touch-manipulation grid-cols-[auto_1fr_auto] items-start gap-x-3 py-3 active:bg-tint"
              >
                <span className="w-[5.2rem] leading-tight font-bold">{visit.windowWords}</span>
                <span className="min-w-0">
                  <span className="block text-lead leading-tight font-bold">
                    {visit.customerName}
                  </span>
                  <span className="block">
                    {visit.street}
                    {visit.town ? `, ${visit.town}` : ''}
                  </span>
                  <span className="block text-note text-graphite">
                    {visitKindWords[visit.kind]} · {visit.jobTitle}
                  </span>
                  <VisitState visit={visit} />
                </span>
                <span aria-hidden="true" className="self-center text-graphite">
                  ›
                </span>
              </Link>
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

function stopWords(count: number): string {
  return count === 1 ? '1 stop' : `${count} stops`;
}
