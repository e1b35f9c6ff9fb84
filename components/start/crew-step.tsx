'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { CrewSetting } from '@/lib/contracts/crews';
import { apiPaths } from '@/lib/paths';

type CrewStepProps = { crews: readonly CrewSetting[]; person: { personId: string; name: string } };
type Does = CrewSetting['does'];

const colours = 6;

/** A crew to book the first visit with: whoever opens the shop mostly goes out alone at first. */
export function CrewStep({ crews, person }: CrewStepProps) {
  const router = useRouter();
  const measures = crews.some((crew) => crew.does === 'measure');
  const [chosen, setChosen] = useState<Does | null>(null);
  const does = chosen ?? (measures ? 'fit' : 'measure');
  const form = useFormRequest(
    async (fields) => {
      await askServer(apiPaths.crews(), {
        body: {
          name: fields.name ?? '',
          does,
          colour: String((crews.length % colours) + 1),
          personIds: fields.self ? [person.personId] : [],
        },
      });
    },
    () => {
      form.rest();
      setChosen(null);
      router.refresh();
    },
  );
  return (
    <form onSubmit={form.submit} className="flex w-full max-w-form flex-col gap-3">
      <p>A visit is booked with a crew. Somebody who measures alone is a crew too.</p>
      {crews.length > 0 ? (
        <ul>
          {crews.map((crew) => (
            <li key={crew.id} className="border-b border-rule py-1">
              <b>{crew.name}</b> {doesWords[crew.does]}
              {crew.members.length > 0
                ? `: ${crew.members.map(({ name }) => name).join(', ')}`
                : ', nobody in it yet'}
            </li>
          ))}
        </ul>
      ) : null}
      <div className="grid gap-3 sm:grid-cols-2">
        <SelectField
          label="It"
          value={does}
          onChange={(event) => setChosen(event.target.value === 'fit' ? 'fit' : 'measure')}
          options={[
            { value: 'measure', label: doesWords.measure },
            { value: 'fit', label: doesWords.fit },
          ]}
        />
        <TextField
          key={`${does} ${crews.length}`}
          label="Is called"
          name="name"
          defaultValue={usualName(does, person.name, crews.length)}
          maxLength={40}
          required
          error={form.errorOf('name')}
        />
      </div>
      <CheckField label={`${person.name} goes with it`} name="self" value="yes" defaultChecked />
      <FormError problem={form.problem} shownFields={['name']} />
      <div>
        <Button
          type="submit"
          look={crews.length > 0 ? 'line' : 'fill'}
          busyText={form.isBusy ? 'Saving…' : undefined}
        >
          {crews.length > 0 ? 'Add this crew too' : 'Make this crew'}
        </Button>
      </div>
    </form>
  );
}

const doesWords: Record<Does, string> = { measure: 'measures', fit: 'installs' };

/** "Measure: Tilda", "Crew 2". */
function usualName(does: Does, name: string, count: number): string {
  return does === 'measure' ? `Measure: ${name.split(' ')[0]}` : `Crew ${count + 1}`;
}
