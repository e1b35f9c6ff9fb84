import { Button } from '@/components/ui/button';
import { TextareaField } from '@/components/ui/textarea-field';
import type { CustomerTimesView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { customerWords, unbroken } from './customer-words';
import { HeldTime } from './held-time';
import { PageFrame } from './page-frame';

type Props = { view: CustomerTimesView; token: string; wasTaken: boolean };

/** Times that work for the shop; one tap keeps one, the next takes it. No script is needed. */
export function TimesPage({ view, token, wasTaken }: Props) {
  const words = customerWords(view.language);
  return (
    <PageFrame of={view}>
      <h1 className="mt-5 text-title leading-tight font-bold">{words.timesTitle}</h1>
      <p className="mt-2">{words.now(view.dayWords, view.windowWords)}</p>
      {wasTaken ? (
        <p role="status" className="mt-3 border-l-4 border-ochre bg-tint px-3 py-2">
          {words.taken}
        </p>
      ) : null}
      {view.mayChange ? (
        <Choices view={view} token={token} />
      ) : (
        <p className="mt-4 border-l-4 border-ochre bg-tint px-3 py-2">{words.tooLate}</p>
      )}
      <p className="mt-6 text-center">
        <a href={paths.customerVisit(token)} className="inline-block py-3 underline">
          {words.keep}
        </a>
      </p>
    </PageFrame>
  );
}

function Choices({ view, token }: Omit<Props, 'wasTaken'>) {
  const words = customerWords(view.language);
  const { hold, times } = view;
  return (
    <>
      {hold ? <HeldTime hold={hold} language={view.language} token={token} /> : null}
      {hold ? <h2 className="mt-6 font-bold">{words.others}</h2> : null}
      {!hold && times.length > 0 ? <p className="mt-2">{words.choose}</p> : null}
      {times.length === 0 ? (
        <p className="mt-2">{words.noTimes}</p>
      ) : (
        <ul className="mt-3 flex flex-col gap-3">
          {times.map((time) => (
            <li key={`${time.date} ${time.time}`}>
              <form method="post" action={paths.customerHold(token)}>
                <input type="hidden" name="date" value={time.date} />
                <input type="hidden" name="time" value={time.time} />
                <Button type="submit" size="thumb" look="line" className="flex-col gap-0">
                  <span className="first-letter:uppercase">{time.dayWords}</span>
                  <span className="font-normal text-balance text-ink">
                    {unbroken(time.windowWords)}
                  </span>
                </Button>
              </form>
            </li>
          ))}
        </ul>
      )}
      <details className="mt-6 rounded border border-pine" open={times.length === 0 && !hold}>
        <summary className="flex min-h-thumb cursor-pointer items-center justify-center px-4 py-2 text-center text-lead font-bold text-pine">
          {times.length === 0 && !hold ? words.askCall : words.noneSuits}
        </summary>
        <form
          method="post"
          action={paths.customerAnswer(token)}
          className="flex flex-col gap-3 px-4 pb-4"
        >
          <input type="hidden" name="answer" value="call-me" />
          <TextareaField id="call-me" label={words.callHint} name="words" maxLength={300} />
          <Button type="submit" size="thumb" look="line">
            {words.callMe}
          </Button>
        </form>
      </details>
    </>
  );
}
