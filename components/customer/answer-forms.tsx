import { Button } from '@/components/ui/button';
import { buttonLook } from '@/components/ui/button-look';
import { CheckField } from '@/components/ui/check-field';
import { TextareaField } from '@/components/ui/textarea-field';
import type { CustomerVisitView } from '@/lib/contracts/visits';
import { missingThings } from '@/lib/messages/missing-words';
import { paths } from '@/lib/paths';
import { customerWords } from './customer-words';

/** Plain forms, posted: a link that is looked at by a mail scanner confirms nothing. */
export function AnswerForms({ visit, token }: { visit: CustomerVisitView; token: string }) {
  const words = customerWords(visit.language);
  const action = paths.customerAnswer(token);
  // Who says that something is missing says next that it is there: a yes comes after it.
  const isAsked = visit.status !== 'confirmed' && !visit.saysNotReady;
  return (
    <div className="mt-4 flex flex-col gap-3">
      {isAsked ? (
        <>
          <p className="text-lead font-bold">{words.ask}</p>
          <OneTap action={action} answer="confirm" text={words.yes} />
        </>
      ) : null}
      {visit.saysNotReady ? (
        <OneTap action={action} answer="ready-now" text={words.readyNow} />
      ) : null}
      <a href={paths.customerTimes(token)} className={buttonLook('line', 'thumb')}>
        {words.another}
      </a>
      <details className="rounded border border-pine">
        <summary className="flex min-h-thumb cursor-pointer items-center justify-center px-4 py-2 text-center text-lead font-bold text-pine">
          {visit.saysNotReady ? words.notReadyMore : words.notReady}
        </summary>
        <form method="post" action={action} className="flex flex-col gap-3 px-4 pb-4">
          <input type="hidden" name="answer" value="not-ready" />
          <fieldset>
            <legend className="font-medium">{words.notReadyLegend}</legend>
            {missingThings.map((thing) => (
              <CheckField key={thing} name={thing} value="yes" label={words.missing[thing]} />
            ))}
          </fieldset>
          <TextareaField id="not-ready" label={words.more} name="words" maxLength={300} />
          <Button type="submit" size="thumb" look="line">
            {words.send}
          </Button>
        </form>
      </details>
    </div>
  );
}

function OneTap({
  action,
  answer,
  text,
}: {
  action: string;
  answer: 'confirm' | 'ready-now';
  text: string;
}) {
  return (
    <form method="post" action={action}>
      <input type="hidden" name="answer" value={answer} />
      <Button type="submit" size="thumb">
        {text}
      </Button>
    </form>
  );
}
