'use client';

import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import { Verdict } from '@/components/ui/verdict';
import { consentWays, type ThreadView } from '@/lib/contracts/messages';
import { markConsent } from './messages-query';

/** What the customer allows now, every word they said about it with its proof, and a place to write the next. */
export function ConsentPanel({ thread, mayMark }: { thread: ThreadView; mayMark: boolean }) {
  const because = (channel: 'sms' | 'email') =>
    thread.leftOut.find((way) => way.channel === channel)?.because;
  return (
    <section>
      <TitleBlock title="What they allow" />
      <ul className="py-3">
        {(['sms', 'email'] as const).map((channel) => (
          <li key={channel}>
            <Verdict kind={because(channel) ? 'off' : 'confirmed'}>
              {channel === 'sms' ? 'Texts' : 'E-mail'}: {because(channel) ?? 'yes'}
            </Verdict>
          </li>
        ))}
      </ul>
      {thread.consents.length > 0 ? (
        <ol className="border-t border-rule text-note">
          {thread.consents.map((said) => (
            <li key={said.id} className="border-b border-rule py-1.5">
              {said.atWords} · {said.channel === 'sms' ? 'texts' : 'e-mail'} ·{' '}
              <b>{said.given ? 'yes' : 'no'}</b>: {said.how}
              {said.by ? `, written down by ${said.by}` : ''}
              {said.proof ? <q className="block">{said.proof}</q> : null}
            </li>
          ))}
        </ol>
      ) : null}
      {mayMark ? <MarkForm customerId={thread.customerId} /> : null}
    </section>
  );
}

function MarkForm({ customerId }: { customerId: string }) {
  const router = useRouter();
  const form = useFormRequest(
    async (fields) => {
      await markConsent({
        customerId,
        channel: fields.channel === 'email' ? 'email' : 'sms',
        given: fields.given === 'yes',
        way: consentWays.find((way) => way === fields.way) ?? 'on the phone',
        proof: fields.proof ?? '',
      });
    },
    () => {
      showToast({ text: 'Written down' });
      router.refresh();
      form.rest();
    },
  );
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-3 pt-4">
      <div className="grid grid-cols-3 gap-3">
        <SelectField
          label="They said"
          name="given"
          defaultValue="no"
          options={[
            { value: 'no', label: 'no' },
            { value: 'yes', label: 'yes' },
          ]}
        />
        <SelectField
          label="to"
          name="channel"
          options={[
            { value: 'sms', label: 'texts' },
            { value: 'email', label: 'e-mail' },
          ]}
        />
        <SelectField
          label="How"
          name="way"
          options={consentWays.map((way) => ({ value: way, label: way }))}
        />
      </div>
      <TextField
        label="Their words, or where it is written"
        name="proof"
        maxLength={400}
        hint="A yes needs it: it is the proof. A no holds at once."
        error={form.errorOf('proof')}
      />
      <FormError problem={form.problem} shownFields={['proof']} />
      <div>
        <Button type="submit" look="line" busyText={form.isBusy ? 'Writing…' : undefined}>
          Write it down
        </Button>
      </div>
    </form>
  );
}
