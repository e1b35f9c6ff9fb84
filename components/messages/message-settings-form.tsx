'use client';

import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import type { MessageSettingsView } from '@/lib/contracts/wordings';
import { maySilence, occasions, occasionWhen, occasionWords } from '@/lib/messages/occasions';
import { saveMessageSettings } from './messages-query';

const tellings = occasions.filter(maySilence);

/** On which occasions customers are told, and what one message of a text costs the shop. */
export function MessageSettingsForm({
  settings,
  mayChange,
}: {
  settings: MessageSettingsView;
  mayChange: boolean;
}) {
  const router = useRouter();
  const form = useFormRequest(
    async (fields) => {
      const price = (fields.segmentPrice ?? '').trim().replace(',', '.');
      await saveMessageSettings({
        silentOn: tellings.filter((occasion) => fields[occasion] !== 'yes'),
        segmentPrice: price === '' ? null : Number(price),
        currency: (fields.currency ?? '').trim().toUpperCase(),
      });
    },
    () => {
      showToast({ text: 'Saved' });
      router.refresh();
      form.rest();
    },
  );
  return (
    <form onSubmit={form.submit}>
      <TitleBlock title="When customers are told" />
      <fieldset disabled={!mayChange} className="flex flex-col gap-1 py-3">
        {tellings.map((occasion) => (
          <CheckField
            key={occasion}
            name={occasion}
            value="yes"
            label={occasionWords[occasion]}
            hint={occasionWhen[occasion]}
            defaultChecked={!settings.silentOn.includes(occasion)}
          />
        ))}
        <div className="grid grid-cols-2 gap-3 pt-2">
          <TextField
            label="Price of one message"
            name="segmentPrice"
            isOptional
            inputMode="decimal"
            hint="From your texting provider; a long text is several."
            defaultValue={settings.segmentPrice ?? ''}
            error={form.errorOf('segmentPrice')}
          />
          <TextField
            label="Currency"
            name="currency"
            maxLength={3}
            defaultValue={settings.currency}
            error={form.errorOf('currency')}
          />
        </div>
        <FormError problem={form.problem} shownFields={['segmentPrice', 'currency']} />
        {mayChange ? (
          <div className="pt-2">
            <Button type="submit" look="line" busyText={form.isBusy ? 'Saving…' : undefined}>
              Save
            </Button>
          </div>
        ) : null}
      </fieldset>
    </form>
  );
}
