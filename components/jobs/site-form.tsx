'use client';

import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { showToast } from '@/components/ui/toast-store';
import type { JobView } from '@/lib/contracts/jobs';
import { apiPaths } from '@/lib/paths';

/** State of the site: what the order of work waits for. */
export function SiteForm({ job }: { job: JobView }) {
  const router = useRouter();
  const form = useFormRequest(
    async (fields) => {
      await askServer(apiPaths.job(job.id), {
        method: 'PATCH',
        body: {
          wallsReady: fields.wallsReady,
          siteReadyOn: fields.siteReadyOn || null,
          floorAgreed: fields.floorAgreed === 'yes',
          notReady: fields.notReady ?? '',
          wayIn: fields.wayIn ?? '',
          notes: fields.notes ?? '',
        },
      });
    },
    () => {
      showToast({ text: 'Saved' });
      router.refresh();
      form.rest();
    },
  );
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-3 py-3">
      <div className="grid grid-cols-2 gap-3">
        <SelectField
          label="Walls"
          name="wallsReady"
          defaultValue={job.wallsReady}
          options={[
            { value: 'closed', label: 'closed' },
            { value: 'bare-studs', label: 'bare studs' },
            { value: 'not-yet', label: 'not up yet' },
          ]}
        />
        <TextField
          label="Site ready on"
          name="siteReadyOn"
          type="date"
          defaultValue={job.siteReadyOn ?? ''}
          error={form.errorOf('siteReadyOn')}
        />
      </div>
      <CheckField
        label="Floor down, or its build-up agreed"
        name="floorAgreed"
        value="yes"
        defaultChecked={job.floorAgreed}
      />
      <TextField
        label="Customer says not ready"
        name="notReady"
        hint="Holds the install until it is empty again."
        defaultValue={job.notReady}
        error={form.errorOf('notReady')}
      />
      <TextareaField label="Way in" name="wayIn" defaultValue={job.wayIn} />
      <TextareaField label="Notes" name="notes" defaultValue={job.notes} />
      <FormError problem={form.problem} shownFields={['siteReadyOn', 'notReady']} />
      <div>
        <Button type="submit" look="line" busyText={form.isBusy ? 'Saving…' : undefined}>
          Save
        </Button>
      </div>
    </form>
  );
}
