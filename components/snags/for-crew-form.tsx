'use client';

import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import type { ForCrewView } from '@/lib/contracts/stops';
import { apiPaths } from '@/lib/paths';

/** What the crew must know at the door. A code that was typed is never shown here again. */
export function ForCrewForm({ jobId, forCrew }: { jobId: string; forCrew: ForCrewView }) {
  const router = useRouter();
  const form = useFormRequest(
    async (fields) => {
      const code = fields.accessCode?.trim() ?? '';
      const codeChange =
        fields.dropCode === 'yes' ? { accessCode: '' } : code ? { accessCode: code } : {};
      await askServer(apiPaths.forCrew(jobId), {
        method: 'PATCH',
        body: { parking: fields.parking ?? '', finish: fields.finish ?? '', ...codeChange },
      });
    },
    () => {
      showToast({ text: 'Saved' });
      router.refresh();
      form.rest();
    },
  );
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-3 py-3" autoComplete="off">
      <TextField label="Parking" name="parking" maxLength={200} defaultValue={forCrew.parking} />
      <TextField
        label="Access code"
        name="accessCode"
        maxLength={60}
        autoComplete="off"
        hint={
          forCrew.codeSetWords
            ? `A code is kept since ${forCrew.codeSetWords}. Its crew sees it on the day; nobody sees it here. Type a new one to replace it.`
            : 'Kept sealed; shown to the crew of the visit, on its day alone. Each look is written down.'
        }
      />
      {forCrew.codeSetWords ? (
        <CheckField label="Take the code away" name="dropCode" value="yes" />
      ) : null}
      <TextField label="Finish" name="finish" maxLength={120} defaultValue={forCrew.finish} />
      <FormError problem={form.problem} shownFields={[]} />
      <div>
        <Button type="submit" look="line" busyText={form.isBusy ? 'Saving…' : undefined}>
          Save
        </Button>
      </div>
    </form>
  );
}
