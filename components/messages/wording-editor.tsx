'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { showToast } from '@/components/ui/toast-store';
import type { WordingView } from '@/lib/contracts/wordings';
import { checkTemplate } from '@/lib/messages/check-template';
import { fieldsOf, fieldWords, isTextAnswer } from '@/lib/messages/occasions';
import { usualWording } from '@/lib/messages/render-message';
import type { Wording, WordingPart } from '@/lib/messages/template';
import type { ProblemDetails } from '@/lib/problem-details';
import { saveWording } from './messages-query';
import { WordingPreview } from './wording-preview';

type Props = {
  wording: WordingView;
  shop: { name: string; phone: string };
  price: { perSegment: number; currency: string } | null;
  mayChange: boolean;
};

/** Fields are checked and the message is shown as it is written; what could not be sent is not saved. */
export function WordingEditor({ wording, shop, price, mayChange }: Props) {
  const { occasion, language } = wording;
  const router = useRouter();
  const [draft, setDraft] = useState<Wording>({
    sms: wording.sms,
    subject: wording.subject,
    email: wording.email,
  });
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const isText = isTextAnswer(occasion);
  const change = (part: WordingPart) => (event: { target: { value: string } }) =>
    setDraft({ ...draft, [part]: event.target.value });
  const wrongWith = (part: WordingPart) =>
    checkTemplate(draft[part], { occasion, part, language })
      .map(({ message }) => message)
      .join(' ') || undefined;

  async function save(words: Wording) {
    setIsBusy(true);
    setProblem(null);
    try {
      await saveWording({ occasion, language, ...words });
      showToast({ text: 'Saved. It is said like this from now on.' });
      router.refresh();
    } catch (caught) {
      setProblem(problemOf(caught));
    } finally {
      setIsBusy(false);
    }
  }
  const submit = (event: FormEvent) => {
    event.preventDefault();
    save(draft);
  };

  return (
    <div className="grid grid-cols-1 items-start gap-x-10 gap-y-6 lg:grid-cols-2">
      <form onSubmit={submit}>
        <fieldset disabled={!mayChange} className="flex flex-col gap-3">
          <TextareaField
            label="Text"
            value={draft.sms}
            onChange={change('sms')}
            error={wrongWith('sms')}
          />
          {isText ? null : (
            <>
              <TextField
                label="Subject of the e-mail"
                value={draft.subject}
                onChange={change('subject')}
                error={wrongWith('subject')}
              />
              <TextareaField
                label="E-mail"
                rows={10}
                value={draft.email}
                onChange={change('email')}
                error={wrongWith('email')}
              />
            </>
          )}
          <dl className="text-note text-graphite">
            {fieldsOf[occasion].map((field) => (
              <div key={field}>
                <dt className="inline font-bold text-ink">{`{${field}}`}</dt>{' '}
                <dd className="inline">{fieldWords[field]}</dd>
              </div>
            ))}
          </dl>
          <FormError problem={problem} />
          {mayChange ? (
            <div className="flex flex-wrap gap-3">
              <Button type="submit" busyText={isBusy ? 'Saving…' : undefined}>
                Save
              </Button>
              {wording.isOwn ? (
                <Button look="line" onClick={() => save(usualWording(occasion, language))}>
                  Back to Setwell’s words
                </Button>
              ) : null}
            </div>
          ) : (
            <p className="text-graphite">The owner can change these words.</p>
          )}
        </fieldset>
      </form>
      <WordingPreview
        occasion={occasion}
        language={language}
        draft={draft}
        shop={shop}
        price={price}
      />
    </div>
  );
}
