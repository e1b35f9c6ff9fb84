'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { buttonLook } from '@/components/ui/button-look';
import { Dialog } from '@/components/ui/dialog';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import type { ErasureView } from '@/lib/contracts/keeping';
import { apiPaths } from '@/lib/paths';

/** For the owner: everything of this customer in one file, and forgetting them. */
export function CustomerData({ customerId }: { customerId: string }) {
  const [erasure, setErasure] = useState<ErasureView | null>(null);
  const ask = async () => {
    try {
      setErasure(await askServer<ErasureView>(apiPaths.customerErasure(customerId)));
    } catch (caught) {
      showToast({ text: problemOf(caught).title });
    }
  };
  return (
    <div className="flex flex-wrap items-center gap-3 py-3">
      <a className={buttonLook('line', 'desk')} href={apiPaths.customerExport(customerId)} download>
        Save everything of this customer
      </a>
      <Button look="line" onClick={ask}>
        Erase this customer…
      </Button>
      {erasure ? (
        <EraseDialog customerId={customerId} erasure={erasure} onClose={() => setErasure(null)} />
      ) : null}
    </div>
  );
}

type EraseDialogProps = { customerId: string; erasure: ErasureView; onClose: () => void };

function EraseDialog({ customerId, erasure, onClose }: EraseDialogProps) {
  const router = useRouter();
  const form = useFormRequest(
    async ({ nameAgain }) => {
      await askServer(apiPaths.customerErasure(customerId), {
        method: 'POST',
        body: { nameAgain: nameAgain ?? '' },
      });
    },
    () => {
      showToast({ text: 'Erased' });
      onClose();
      router.refresh();
    },
  );
  const counted = [
    [erasure.messages, 'messages lose their words and addresses'],
    [erasure.files, 'photos and papers are removed'],
    [erasure.signatures, 'signatures are removed'],
  ] as const;
  return (
    <Dialog isOpen onClose={onClose} title={`Erase ${erasure.customerName}`}>
      <form onSubmit={form.submit} className="flex flex-col gap-3">
        <p>
          Name, phone, e-mail, street and way in go from {erasure.jobs}{' '}
          {erasure.jobs === 1 ? 'job' : 'jobs'}. This cannot be taken back.
        </p>
        <ul className="list-disc pl-5">
          {counted.map(([count, words]) =>
            count > 0 ? (
              <li key={words}>
                {count} {words}
              </li>
            ) : null,
          )}
          <li>Times, sizes and readings stay for the numbers; so does a “stop”.</li>
          <li>Copies of the database keep them until the copies are eight weeks old.</li>
        </ul>
        {erasure.openVisits > 0 ? (
          <p className="border-l-4 border-ochre bg-tint px-3 py-2">
            {erasure.openVisits} still to come: call off in the diary first.
          </p>
        ) : (
          <TextField
            label="Type the name to confirm"
            name="nameAgain"
            autoComplete="off"
            error={form.errorOf('nameAgain')}
          />
        )}
        <FormError problem={form.problem} shownFields={['nameAgain']} />
        {erasure.openVisits > 0 ? null : (
          <div>
            <Button type="submit" busyText={form.isBusy ? 'Erasing…' : undefined}>
              Erase for good
            </Button>
          </div>
        )}
      </form>
    </Dialog>
  );
}
