import type { CustomerVisitView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { AnswerForms } from './answer-forms';
import { customerWords, regionalWords, unbroken } from './customer-words';
import { PageFrame } from './page-frame';
import { VisitStanding } from './visit-standing';

type Props = {
  visit: CustomerVisitView;
  token: string;
  /** Something was signed, and there is a copy of it. */
  hasCopy: boolean;
  /** Opens the phone's own map at the site. */
  mapHref: string;
};

/** What the customer sees from the link: when, who, what to clear, and one tap to say yes. No script is needed. */
export function VisitPage({ visit, token, hasCopy, mapHref }: Props) {
  const words = customerWords(visit.language);
  const place = [visit.street, visit.town].filter(Boolean).join(', ');
  const { status } = visit;
  const isOver = status === 'done' || status === 'missed' || status === 'called-off';
  // A late crew and one that is there have said so above.
  const saysWindow = visit.arrivalWords === '' && status !== 'on-site';
  const mayAnswer = status === 'held' || status === 'booked' || status === 'confirmed';
  return (
    <PageFrame of={visit}>
      <h1 className="mt-5 text-title leading-tight font-bold">
        <span className="block first-letter:uppercase">{visit.weekdayWords}</span>
        <span className="block">{visit.dateWords}</span>
      </h1>
      <VisitStanding visit={visit} />
      {hasCopy ? (
        <p className="mt-3">
          <a href={paths.customerSignOff(token)} className="inline-block py-2 underline">
            {words.copy}
          </a>
        </p>
      ) : null}
      {isOver ? null : (
        <>
          {saysWindow ? (
            <p className="mt-2 text-lead text-balance">
              {unbroken(words.arrive(visit.windowWords, visit.untilWords))}
            </p>
          ) : null}
          <p className="mt-2">
            {words.comes(visit.whoComes, regionalWords(words.what[visit.kind], visit))}{' '}
            <a href={mapHref} className="underline" title={words.map}>
              {place}
            </a>
            .
          </p>
          {mayAnswer ? <AnswerForms visit={visit} token={token} /> : null}
          <p className="mt-4 text-center">
            <a href={paths.customerCalendar(token)} className="inline-block py-2 underline">
              {words.calendar}
            </a>
          </p>
          {status === 'on-site' ? null : <Before visit={visit} />}
        </>
      )}
    </PageFrame>
  );
}

function Before({ visit }: { visit: CustomerVisitView }) {
  const words = customerWords(visit.language);
  return (
    <section className="mt-5">
      <h2 className="border-b border-ink pb-1 font-bold">{words.before}</h2>
      <ul className="mt-2 list-disc pl-5">
        {words.clear[visit.kind].map((line) => (
          <li key={line} className="my-1">
            {regionalWords(line, visit)}
          </li>
        ))}
      </ul>
      {visit.isOldHouse ? <p className="mt-3">{words.oldHouse}</p> : null}
      <p className="mt-3 text-note text-graphite">{words.caution}</p>
    </section>
  );
}
