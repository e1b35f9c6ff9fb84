'use client';

import { DirectionsLink } from '@/components/phone/directions-link';
import { useHolder } from '@/components/phone/phone-person';
import { RoomsOfVisit } from '@/components/phone/rooms-of-visit';
import { TitleBlock } from '@/components/ui/title-block';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { AccessCode } from './access-code';
import { useCrew } from './crew-language';
import { NextStop } from './next-stop';
import { SiteTime } from './site-time';
import { StopMenu } from './stop-menu';
import { VisitState } from './visit-state';
import { VisitTaps } from './visit-taps';
import { dayIn, windowIn } from './visit-times';

/** One stop: when, where, how to get in, what to do there. */
export function VisitScreen({ visit, stop }: { visit: TodayVisit; stop: StopView | null }) {
  const { mayReport, mayMeasure, zone } = useHolder();
  const crew = useCrew();
  const { language, words, say } = crew;
  return (
    <div lang={language} className="flex flex-col gap-5 px-3.5 py-4">
      <section className="flex flex-col gap-3">
        <TitleBlock
          level={1}
          title={visit.customerName}
          meta={`${say(words.kinds[visit.kind])} · ${visit.jobNumber}`}
        />
        <p className="text-lead font-bold">
          {dayIn(visit, crew, zone)}, {windowIn(visit, crew, zone)}
        </p>
        <VisitState visit={visit} />
        {stop ? <SiteTime visit={visit} stop={stop} /> : null}
        {mayReport ? <VisitTaps visit={visit} stop={stop} /> : null}
        <NextStop visit={visit} />
      </section>

      <section>
        <TitleBlock title={words.theWay} />
        <p className="pt-2 text-lead">
          {visit.street}
          {visit.town ? `, ${visit.town}` : ''}
        </p>
        <div className="grid grid-cols-2 gap-2 py-2">
          <DirectionsLink street={visit.street} town={visit.town} words={words.directions} />
          {visit.phone ? (
            <a
              href={`tel:${visit.phone.replace(/[^+\d]/g, '')}`}
              className="flex min-h-thumb items-center justify-center rounded border border-pine text-center leading-tight font-bold text-pine active:bg-tint"
            >
              <span>
                {words.ring}
                <span className="block text-note font-normal">{visit.phone}</span>
              </span>
            </a>
          ) : null}
        </div>
        <Said label={words.wayIn} text={visit.wayIn} />
        <Said label={words.parking} text={stop?.parking ?? ''} />
        {stop?.hasAccessCode && mayReport ? <AccessCode visitId={visit.id} /> : null}
        <Said label={words.customerSays} text={visit.customerSays} />
        <Said label={words.notes} text={visit.notes} />
      </section>

      {stop && mayReport ? <StopMenu visit={visit} stop={stop} /> : null}
      {mayMeasure ? <RoomsOfVisit visit={visit} /> : null}
    </div>
  );
}

function Said({ label, text }: { label: string; text: string }) {
  if (text === '') return null;
  return (
    <div className="border-t border-rule py-2">
      <p className="text-note text-graphite">{label}</p>
      <p className="whitespace-pre-line">{text}</p>
    </div>
  );
}
