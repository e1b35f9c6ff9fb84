'use client';

import { type FormEvent, useState } from 'react';
import { newId } from '@/components/phone/new-id';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { type SnagKind, type SnagMender, snagKinds, snagMenders } from '@/lib/contracts/snag-kinds';
import { crewEn } from '@/lib/words/crew-en';
import { sendSnag } from './snags-query';
import { useSnagRequest } from './use-snag-request';

type NewSnagProps = { jobId: string; rooms: { id: string; name: string }[] };

/** What a customer rings about, written down with who mends it. */
export function NewSnag({ jobId, rooms }: NewSnagProps) {
  const { ask, isBusy } = useSnagRequest();
  const [isOpen, setIsOpen] = useState(false);
  if (!isOpen) {
    return (
      <Button look="line" onClick={() => setIsOpen(true)}>
        New snag
      </Button>
    );
  }
  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const fields = new FormData(event.currentTarget);
    const text = (name: string) => String(fields.get(name) ?? '').trim();
    const snag = {
      id: newId(),
      jobId,
      kind: text('kind') as SnagKind,
      roomId: text('roomId') || null,
      unitId: null,
      place: text('place'),
      words: text('words'),
      mender: text('mender') as SnagMender,
      dueOn: text('dueOn') || null,
      photoIds: [],
    };
    if (await ask(() => sendSnag(snag), 'Written down')) setIsOpen(false);
  };
  return (
    <form onSubmit={submit} className="flex flex-col gap-3 py-3">
      <TextareaField label="What is not right?" name="words" required maxLength={600} />
      <div className="grid grid-cols-2 gap-3">
        <SelectField
          label="What is it?"
          name="kind"
          options={snagKinds.map((kind) => ({ value: kind, label: crewEn.snagKinds[kind] }))}
        />
        <SelectField
          label="Who mends it?"
          name="mender"
          options={snagMenders.map((mender) => ({ value: mender, label: crewEn.menders[mender] }))}
        />
        <SelectField
          label="Room"
          name="roomId"
          emptyLabel="no room"
          options={rooms.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <TextField label="Unit or place" name="place" isOptional maxLength={80} />
        <TextField label="By when" name="dueOn" type="date" isOptional />
      </div>
      <div className="flex gap-2">
        <Button type="submit" busyText={isBusy ? 'Saving…' : undefined}>
          Write it down
        </Button>
        <Button look="plain" onClick={() => setIsOpen(false)}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
