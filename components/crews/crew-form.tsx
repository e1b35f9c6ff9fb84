'use client';

import { type FormEvent, useState } from 'react';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { apiPaths } from '@/lib/paths';
import type { ProblemDetails } from '@/lib/problem-details';
import { crewColours } from './crew-colours';
import { useRefetchCrews } from './crews-query';

/** Who goes out together. A measurer alone is a crew of one. */
export function CrewForm({ people }: { people: readonly { id: string; name: string }[] }) {
  const refetch = useRefetchCrews();
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [isBusy, setIsBusy] = useState(false);

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const form = event.currentTarget;
    const fields = new FormData(form);
    setIsBusy(true);
    setProblem(null);
    try {
      await askServer(apiPaths.crews(), {
        body: {
          name: fields.get('name'),
          does: fields.get('does'),
          colour: fields.get('colour'),
          personIds: fields.getAll('person'),
        },
      });
      form.reset();
      await refetch();
    } catch (caught) {
      setProblem(problemOf(caught));
    } finally {
      setIsBusy(false);
    }
  }

  return (
    <form onSubmit={submit} className="mt-6 flex max-w-form flex-col gap-3">
      <TitleBlock title="One more crew" level={3} />
      <TextField
        label="Name"
        name="name"
        placeholder="Crew North"
        required
        error={problem?.errors?.name}
      />
      <div className="grid grid-cols-2 gap-3">
        <SelectField
          label="Does"
          name="does"
          options={[
            { value: 'fit', label: 'installs' },
            { value: 'measure', label: 'measures' },
          ]}
        />
        <SelectField label="Colour in the diary" name="colour" options={crewColours} />
      </div>
      <fieldset>
        <legend className="font-medium">People</legend>
        <div className="grid grid-cols-2 gap-x-6">
          {people.map((person) => (
            <CheckField key={person.id} label={person.name} name="person" value={person.id} />
          ))}
        </div>
      </fieldset>
      <FormError problem={problem} shownFields={['name']} />
      <div>
        <Button type="submit" busyText={isBusy ? 'Saving…' : undefined}>
          Add the crew
        </Button>
      </div>
    </form>
  );
}
