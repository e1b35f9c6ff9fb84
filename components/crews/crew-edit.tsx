'use client';

import { type FormEvent, type KeyboardEvent, useState } from 'react';
import type { MapGround } from '@/components/map/map-day';
import { PlaceField } from '@/components/place/place-field';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import type { ChangeCrewInput, CrewSetting, CrewsView } from '@/lib/contracts/crews';
import { visitKinds } from '@/lib/schedule/visit-kind';
import { doesKind, visitKindWords } from '@/lib/schedule/visit-kind-words';
import { AskOutside } from './ask-outside';
import { crewColours } from './crew-colours';
import { changeCrew } from './crews-query';
import { MemberFields } from './member-fields';
import { readPattern, weekTexts } from './pattern-draft';
import { PatternFields } from './pattern-fields';
import { useTriedChange } from './use-tried-change';

type CrewEditProps = {
  crew: CrewSetting;
  people: CrewsView['people'];
  ground: MapGround;
  today: string;
  onDone: () => void;
};

/** A crew, changed where it stands. Escape leaves it as it was. */
export function CrewEdit({ crew, people, ground, today, onDone }: CrewEditProps) {
  const [draft, setDraft] = useState(() => draftOf(crew, today));
  const [weeks, setWeeks] = useState(() => weekTexts(crew.pattern));
  const set = (change: Partial<typeof draft>) => setDraft({ ...draft, ...change });
  const change = useTriedChange<Omit<ChangeCrewInput, 'isTrial'>>(changeCrew, () => {
    showToast({ text: `${draft.name} is saved.` });
    onDone();
  });

  function submit(event: FormEvent) {
    event.preventDefault();
    const pattern = draft.hasOwnPattern ? readPattern(weeks, draft.firstWeekOf) : null;
    // A day that cannot be read says so at its field.
    if (draft.hasOwnPattern && !pattern) return;
    const { name, does, colour, kinds, members, base } = draft;
    const own = pattern && {
      ...pattern,
      weeks: pattern.weeks.map((week) => week.map((day) => ({ ...day }))),
    };
    change.save({ crewId: crew.id, name, does, colour, kinds, members, base, pattern: own });
  }
  const leave = (event: KeyboardEvent) => {
    if (event.key === 'Escape' && change.outside === null) onDone();
  };

  return (
    <form
      onSubmit={submit}
      onKeyDown={leave}
      className="flex flex-col gap-5 border-x border-b border-ink bg-sheet px-4 py-4"
    >
      <div className="grid gap-3 sm:grid-cols-3">
        <TextField
          label="Name"
          value={draft.name}
          required
          autoFocus
          error={change.problem?.errors?.name}
          onChange={(event) => set({ name: event.target.value })}
        />
        <SelectField
          label="Does"
          value={draft.does}
          options={[
            { value: 'fit', label: 'installs' },
            { value: 'measure', label: 'measures' },
          ]}
          onChange={(event) =>
            set({ does: event.target.value === 'fit' ? 'fit' : 'measure', kinds: [] })
          }
        />
        <SelectField
          label="Colour in the diary"
          value={draft.colour}
          options={crewColours}
          onChange={(event) => set({ colour: event.target.value as CrewSetting['colour'] })}
        />
      </div>

      <fieldset>
        <legend className="font-medium">Goes out for</legend>
        <div className="flex flex-wrap gap-x-6">
          {visitKinds.map((kind) => (
            <CheckField
              key={kind}
              label={visitKindWords[kind]}
              checked={goes(draft, kind)}
              onChange={(event) => {
                const now = visitKinds.filter((one) =>
                  one === kind ? event.target.checked : goes(draft, one),
                );
                if (now.length > 0) set({ kinds: now });
              }}
            />
          ))}
        </div>
      </fieldset>

      <section className="flex flex-col gap-1">
        <TitleBlock title="People" level={3} />
        <MemberFields
          people={people}
          members={draft.members}
          onChange={(members) => set({ members })}
        />
      </section>

      <section className="flex flex-col gap-2">
        <TitleBlock title="Days and hours" level={3} />
        <CheckField
          label="The shop's own days and hours"
          checked={!draft.hasOwnPattern}
          onChange={(event) => set({ hasOwnPattern: !event.target.checked })}
        />
        {draft.hasOwnPattern ? (
          <>
            <PatternFields weeks={weeks} onChange={setWeeks} />
            {weeks.length > 1 ? (
              <TextField
                label="A day of week 1"
                type="date"
                className="max-w-48"
                value={draft.firstWeekOf}
                onChange={(event) => set({ firstWeekOf: event.target.value })}
              />
            ) : null}
          </>
        ) : null}
      </section>

      <section className="flex flex-col gap-2">
        <TitleBlock title="Where the day begins and ends" level={3} />
        <TextField
          label="Address"
          value={draft.base.address}
          autoComplete="off"
          onChange={(event) => set({ base: { ...draft.base, address: event.target.value } })}
        />
        <PlaceField
          addressOf={() => ({ street: draft.base.address, town: '', postcode: '' })}
          place={draft.base.place}
          ground={ground}
          onChange={(place) => set({ base: { ...draft.base, place } })}
        />
      </section>

      <FormError problem={change.problem} shownFields={['name']} />
      <div className="flex gap-2">
        <Button type="submit" busyText={change.isBusy ? 'Saving…' : undefined}>
          Save {crew.name}
        </Button>
        <Button look="line" onClick={onDone} keyName="Esc">
          Leave it
        </Button>
      </div>
      <AskOutside
        outside={change.outside}
        isBusy={change.isBusy}
        onKeep={change.keepAnyway}
        onLetBe={change.letBe}
      />
    </form>
  );
}

function draftOf(crew: CrewSetting, today: string) {
  const { name, does, colour, kinds, base, hasOwnPattern } = crew;
  const members = crew.members.map(({ personId, weekdays }) => ({ personId, weekdays }));
  const firstWeekOf = hasOwnPattern ? crew.pattern.firstWeekOf : today;
  return { name, does, colour, kinds, base, hasOwnPattern, members, firstWeekOf };
}

/** Where no kind is named, all that what it does includes. */
const goes = (
  { kinds, does }: Pick<CrewSetting, 'kinds' | 'does'>,
  kind: (typeof visitKinds)[number],
) => (kinds.length > 0 ? kinds.includes(kind) : doesKind[kind] === does);
