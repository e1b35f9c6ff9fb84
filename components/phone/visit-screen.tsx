import { TitleBlock } from '@/components/ui/title-block';
import type { TodayVisit } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { DirectionsLink } from './directions-link';
import { RoomsOfVisit } from './rooms-of-visit';
import { VisitState } from './visit-state';
import { VisitTaps } from './visit-taps';

type VisitScreenProps = { visit: TodayVisit; mayReport: boolean; mayMeasure: boolean };

/** One stop: when, where, how to get in, what to do there. */
export function VisitScreen({ visit, mayReport, mayMeasure }: VisitScreenProps) {
  return (
    <div className="flex flex-col gap-5 px-3.5 py-4">
      <section className="flex flex-col gap-3">
        <TitleBlock
          level={1}
          title={visit.customerName}
          meta={`${visitKindWords[visit.kind]} · job ${visit.jobNumber}`}
        />
        <p className="text-lead font-bold">
          {visit.dayWords}, {visit.windowWords}
        </p>
        <VisitState visit={visit} />
        {mayReport ? <VisitTaps visit={visit} /> : null}
      </section>

      <section>
        <TitleBlock title="The way" />
        <p className="pt-2 text-lead">
          {visit.street}
          {visit.town ? `, ${visit.town}` : ''}
        </p>
        <div className="grid grid-cols-2 gap-2 py-2">
          <DirectionsLink street={visit.street} town={visit.town} />
          {visit.phone ? (
            <a
              href={`tel:${visit.phone.replace(/[^+\d]/g, '')}`}
              className="flex min-h-thumb items-center justify-center rounded border border-pine text-center leading-tight font-bold text-pine active:bg-tint"
            >
              <span>
                Ring
                <span className="block text-note font-normal">{visit.phone}</span>
              </span>
            </a>
          ) : null}
        </div>
        <Words label="Way in" text={visit.wayIn} />
        <Words label="The customer says" text={visit.customerSays} />
        <Words label="Notes" text={visit.notes} />
      </section>

      {mayMeasure ? <RoomsOfVisit visit={visit} /> : null}
    </div>
  );
}

function Words({ label, text }: { label: string; text: string }) {
  if (text === '') return null;
  return (
    <div className="border-t border-rule py-2">
      <p className="text-note text-graphite">{label}</p>
      <p className="whitespace-pre-line">{text}</p>
    </div>
  );
}
