import { TitleBlock } from '@/components/ui/title-block';
import { Verdict } from '@/components/ui/verdict';
import type { VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { KindMark } from './kind-mark';
import { statusWords } from './visit-words';

/** Under the waiting list: who of those that fit what is typed is booked already, and when. */
export function FoundVisits({
  visits,
  onOpen,
}: {
  visits: readonly VisitView[];
  onOpen: (visit: VisitView) => void;
}) {
  return (
    <section aria-labelledby="found-visits" className="pt-3">
      <TitleBlock id="found-visits" title="Booked" meta={visits.length} level={3} />
      <ul>
        {visits.map((visit) => {
          const { words, verdict } = statusWords[visit.status];
          return (
            <li key={visit.id} className="border-b border-rule">
              <button
                type="button"
                onClick={() => onOpen(visit)}
                className="block w-full py-2 text-left hover:bg-tint max-lg:min-h-thumb"
              >
                <span className="block font-bold">
                  <KindMark kind={visit.kind} isNamed /> {visitKindWords[visit.kind]} ·{' '}
                  {visit.customerName}, {visit.street}
                </span>
                <span className="flex flex-wrap justify-between gap-x-2 text-note">
                  <span>
                    {visit.dayWords}, {visit.windowWords}, {visit.crewName}
                  </span>
                  <Verdict kind={verdict}>{words}</Verdict>
                </span>
              </button>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
