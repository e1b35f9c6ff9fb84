'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { showToast } from '@/components/ui/toast-store';
import type { ThreadView } from '@/lib/contracts/messages';
import type { ProblemDetails } from '@/lib/problem-details';
import { writeToCustomer } from './messages-query';
import { TextCost } from './text-cost';

type Props = Pick<ThreadView, 'customerId' | 'channels' | 'leftOut'> & { jobId: string | null };

/** A reply in one's own words, by a way that the customer allows. */
export function WriteForm({ customerId, jobId, channels, leftOut }: Props) {
  const router = useRouter();
  const [channel, setChannel] = useState(channels[0] ?? 'sms');
  const [text, setText] = useState('');
  const [subject, setSubject] = useState('');
  const [key, setKey] = useState(() => crypto.randomUUID());
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);

  if (channels.length === 0) {
    return (
      <p className="border-l-4 border-chalk bg-tint px-3 py-2">
        Call them: {leftOut.map(({ because }) => because).join(', ')}.
      </p>
    );
  }

  async function send(event: FormEvent) {
    event.preventDefault();
    setIsBusy(true);
    setProblem(null);
    try {
      const body = { idempotencyKey: key, customerId, jobId, channel, subject, text };
      const { goesOut } = await writeToCustomer(body);
      showToast({ text: goesOut === 'at once' ? 'On its way' : `Goes out ${goesOut}` });
      setText('');
      setSubject('');
      setKey(crypto.randomUUID());
      router.refresh();
    } catch (caught) {
      setProblem(problemOf(caught));
    } finally {
      setIsBusy(false);
    }
  }

  return (
    <form onSubmit={send} className="flex flex-col gap-3 border-t border-rule pt-4">
      <SelectField
        label="Write by"
        value={channel}
        onChange={(event) => setChannel(event.target.value === 'email' ? 'email' : 'sms')}
        options={channels.map((way) => ({ value: way, label: way === 'sms' ? 'text' : 'e-mail' }))}
        hint={leftOut
          .map((way) => `No ${way.channel === 'sms' ? 'text' : 'e-mail'}: ${way.because}.`)
          .join(' ')}
      />
      {channel === 'email' ? (
        <TextField
          label="Subject"
          value={subject}
          onChange={(event) => setSubject(event.target.value)}
          maxLength={120}
          error={problem?.errors?.subject}
        />
      ) : null}
      <TextareaField
        label="Your words"
        value={text}
        onChange={(event) => setText(event.target.value)}
        required
        maxLength={1500}
        error={problem?.errors?.text}
      />
      {channel === 'sms' ? <TextCost text={text} /> : null}
      <FormError problem={problem} shownFields={['subject', 'text']} />
      <div>
        <Button type="submit" busyText={isBusy ? 'Sending…' : undefined}>
          Send
        </Button>
      </div>
    </form>
  );
}
