import { Button } from '@/components/ui/button';
import { TextareaField } from '@/components/ui/textarea-field';
import type { CustomerVisitView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { customerWords } from './customer-words';

/** Plain forms, posted: a link that is looked at by a mail scanner confirms nothing. */
export function AnswerForms({ visit, token }: { visit: CustomerVisitView; token: string }) {
  const words = customerWords(visit.language);
  const action = paths.customerAnswer(token);
  return (
    <div className="mt-4 flex flex-col gap-3">
      {visit.status === 'confirmed' ? null : (
        <form method="post" action={action}>
          <input type="hidden" name="answer" value="confirm" />
          <Button type="submit" size="thumb">
            {words.yes}
          </Button>
        </form>
      )}
      <OpenedForm
        action={action}
        answer="another-time"
        title={words.another}
        hint={words.anotherHint}
        send={words.send}
      />
      <OpenedForm
        action={action}
        answer="not-ready"
        title={words.notReady}
        hint={words.notReadyHint}
        send={words.send}
      />
    </div>
  );
}

function OpenedForm({
  action,
  answer,
  title,
  hint,
  send,
}: {
  action: string;
  answer: 'another-time' | 'not-ready';
  title: string;
  hint: string;
  send: string;
}) {
  return (
    <details className="rounded border border-pine">
      <summary className="flex min-h-thumb cursor-pointer items-center justify-center px-4 text-lead font-bold text-pine">
        {title}
      </summary>
      <form method="post" action={action} className="flex flex-col gap-3 px-4 pb-4">
        <input type="hidden" name="answer" value={answer} />
        <TextareaField id={answer} label={hint} name="words" required maxLength={400} />
        <Button type="submit" size="thumb" look="line">
          {send}
        </Button>
      </form>
    </details>
  );
}
