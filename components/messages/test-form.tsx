'use client';

import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import type { TestAnswer } from '@/lib/contracts/messages';
import { sendTest } from './messages-query';

const looks: Record<TestAnswer['arrived'], VerdictKind> = {
  yes: 'confirmed',
  sent: 'waiting',
  no: 'problem',
};

/** A test to the owner's own phone and inbox, which says what happened to it. */
export function TestForm({ shop }: { shop: { phone: string; email: string } }) {
  return (
    <section className="flex flex-col gap-6">
      <TitleBlock title="Send me a test" />
      <OneTest channel="sms" label="Your mobile number" to={shop.phone} send="Send a text" />
      <OneTest channel="email" label="Your e-mail" to={shop.email} send="Send an e-mail" />
    </section>
  );
}

function OneTest(of: { channel: 'sms' | 'email'; label: string; to: string; send: string }) {
  const [answer, setAnswer] = useState<TestAnswer | null>(null);
  const form = useFormRequest(
    async ({ to = '' }) => {
      setAnswer(null);
      setAnswer(await sendTest({ channel: of.channel, to }));
    },
    () => form.rest(),
  );
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-3">
      <TextField
        label={of.label}
        name="to"
        type={of.channel === 'sms' ? 'tel' : 'email'}
        defaultValue={of.to}
        required
        error={form.errorOf('to')}
      />
      <FormError problem={form.problem} shownFields={['to']} />
      <div>
        <Button type="submit" look="line" busyText={form.isBusy ? 'Sending…' : undefined}>
          {of.send}
        </Button>
      </div>
      {answer ? (
        <div role="status" className="border-l-4 border-rule bg-tint px-3 py-2">
          <Verdict kind={looks[answer.arrived]}>{answer.message}</Verdict>
          {answer.advice ? <p>{answer.advice}</p> : null}
          {answer.detail ? (
            <p className="text-note break-words text-graphite">{answer.detail}</p>
          ) : null}
        </div>
      ) : null}
    </form>
  );
}
