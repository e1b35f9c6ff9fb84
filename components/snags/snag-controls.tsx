'use client';

import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { controlLook } from '@/components/ui/field-frame';
import { TextareaField } from '@/components/ui/textarea-field';
import { snagMenders } from '@/lib/contracts/snag-kinds';
import type { SnagView } from '@/lib/contracts/snags';
import { crewEn } from '@/lib/words/crew-en';
import { sendSnagChange, sendSnagClosing } from './snags-query';
import { useSnagRequest } from './use-snag-request';

/** Who mends it: changed where it stands. */
export function MenderField({ snag }: { snag: SnagView }) {
  const { ask } = useSnagRequest();
  return (
    <select
      key={snag.mender}
      aria-label={`Who mends it: ${snag.words}`}
      defaultValue={snag.mender}
      className={`${controlLook} w-36`}
      onChange={(event) => {
        const mender = snagMenders.find((known) => known === event.target.value);
        if (mender) void ask(() => sendSnagChange(snag.id, { mender }), 'Changed');
      }}
    >
      {snagMenders.map((mender) => (
        <option key={mender} value={mender}>
          {crewEn.menders[mender]}
        </option>
      ))}
    </select>
  );
}

/** By when; kept when the field is left. */
export function DueField({ snag }: { snag: SnagView }) {
  const { ask } = useSnagRequest();
  return (
    <input
      key={snag.dueOn ?? ''}
      type="date"
      aria-label={`By when: ${snag.words}`}
      defaultValue={snag.dueOn ?? ''}
      className={`${controlLook} w-40`}
      onBlur={(event) => {
        const day = event.target.value;
        if (day === (snag.dueOn ?? '')) return;
        void ask(() => sendSnagChange(snag.id, { dueOn: day || null }), 'Changed');
      }}
    />
  );
}

/** Closing from the office wants a word; on site a photo does as well. */
export function CloseSnag({ snag }: { snag: SnagView }) {
  const { ask, isBusy } = useSnagRequest();
  const [isOpen, setIsOpen] = useState(false);
  const [words, setWords] = useState('');
  const close = async (event: FormEvent) => {
    event.preventDefault();
    if (await ask(() => sendSnagClosing(snag.id, words.trim()), 'Closed')) setIsOpen(false);
  };
  return (
    <>
      <Button look="line" onClick={() => setIsOpen(true)}>
        Close
      </Button>
      <Dialog isOpen={isOpen} onClose={() => setIsOpen(false)} title={snag.words}>
        <form onSubmit={close} className="flex flex-col gap-3">
          <TextareaField
            label="How was it mended?"
            required
            maxLength={400}
            value={words}
            onChange={(event) => setWords(event.target.value)}
          />
          <div>
            <Button type="submit" busyText={isBusy ? 'Closing…' : undefined}>
              Close the snag
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
