import { Verdict } from '@/components/ui/verdict';
import type { CustomerVisitView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { doesKind } from '@/lib/schedule/visit-kind-words';
import { AnswerForms } from './answer-forms';
import { customerWords } from './customer-words';

/** What the customer sees from the link: when, who, what to clear, and one tap to say yes. No script is needed. */
export function VisitPage({ visit, token }: { visit: CustomerVisitView; token: string }) {
  const words = customerWords(visit.language);
  const clear = words.clear[doesKind[visit.kind] === 'measure' ? 'measure' : 'work'];
  const names = new Intl.ListFormat(visit.language).format(visit.whoComes);
  const place = [visit.street, visit.town].filter(Boolean).join(', ');
  const over =
    visit.status === 'done' || visit.status === 'missed' || visit.status === 'called-off';
  return (
    <main lang={visit.language} className="in-sun mx-auto min-h-dvh max-w-phone bg-sheet px-5 py-5">
      <header className="flex items-baseline justify-between gap-3 border-b border-ink pb-1">
        <b>{visit.shopName}</b>
        {visit.shopPhone ? (
          <a
            href={`tel:${visit.shopPhone}`}
            className="text-note underline"
            aria-label={words.ring}
          >
            {visit.shopPhone}
          </a>
        ) : null}
      </header>
      <h1 className="mt-5 text-title leading-tight font-bold">
        <span className="block first-letter:uppercase">{visit.weekdayWords}</span>
        <span className="block">{visit.dateWords}</span>
      </h1>
      <Standing visit={visit} />
      {over ? null : (
        <>
          <p className="mt-2 text-lead">{words.arrive(visit.windowWords, visit.untilWords)}</p>
          <p className="mt-2">{words.comes(names, words.what[visit.kind], place)}</p>
          <AnswerForms visit={visit} token={token} />
          <p className="mt-4 text-center">
            <a href={paths.customerCalendar(token)} className="inline-block py-2 underline">
              {words.calendar}
            </a>
          </p>
          <section className="mt-5">
            <h2 className="border-b border-ink pb-1 font-bold">{words.before}</h2>
            <ul className="mt-2 list-disc pl-5">
              {clear.map((line) => (
                <li key={line} className="my-1">
                  {line}
                </li>
              ))}
            </ul>
            {visit.isOldHouse ? <p className="mt-3">{words.oldHouse}</p> : null}
            <p className="mt-3 text-note text-graphite">{words.caution}</p>
          </section>
        </>
      )}
    </main>
  );
}

function Standing({ visit }: { visit: CustomerVisitView }) {
  const words = customerWords(visit.language);
  const lines: Partial<Record<CustomerVisitView['status'], string>> = {
    confirmed: words.thanks,
    done: words.done,
    missed: words.missed,
    'called-off': words.calledOff,
  };
  const line = visit.customerSays ? words.said(visit.customerSays) : lines[visit.status];
  if (!line) return null;
  return (
    <p role="status" className="mt-3 border-l-4 border-moss bg-paper px-3 py-2">
      <Verdict kind={visit.customerSays ? 'waiting' : 'confirmed'}>{line}</Verdict>
    </p>
  );
}
