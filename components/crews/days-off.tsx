'use client';

import { type FormEvent, useState } from 'react';
import { sayProblem } from '@/components/shell/say-problem';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import type { AddDaysOffInput, CrewsView } from '@/lib/contracts/crews';
import { AskOutside } from './ask-outside';
import { addDaysOff, removeDaysOff, useRefetchCrews } from './crews-query';
import { useTriedChange } from './use-tried-change';

type DaysOffProps = { person: CrewsView['people'][number]; today: string; mayChange: boolean };

/** When somebody is off: each stretch with the way to take it back, and a line to add one. */
export function DaysOff({ person, today, mayChange }: DaysOffProps) {
  const refetch = useRefetchCrews();
  const [isOpen, setIsOpen] = useState(false);

  async function takeBack(daysOffId: string, words: string) {
    try {
      await removeDaysOff(daysOffId);
      showToast({ text: `${person.name} works ${words} after all.` });
    } catch (caught) {
      sayProblem(caught);
    }
    await refetch();
  }

  return (
    <div className={isOpen || person.daysOff.length > 0 ? 'flex w-full flex-col' : undefined}>
      {person.daysOff.map(({ id, words, reason }) => (
        <p key={id} className="flex flex-wrap items-center gap-x-3 pl-3.5 text-note">
          off {words}
          {reason ? <span className="text-graphite">{reason}</span> : null}
          {mayChange ? (
            <Button
              look="plain"
              aria-label={`${person.name} works ${words} after all`}
              onClick={() => takeBack(id, words)}
            >
              Take it back
            </Button>
          ) : null}
        </p>
      ))}
      {mayChange && !isOpen ? (
        <div>
          <Button
            look="plain"
            aria-label={`Days off for ${person.name}`}
            onClick={() => setIsOpen(true)}
          >
            Days off
          </Button>
        </div>
      ) : null}
      {isOpen ? (
        <DaysOffForm
          person={person}
          today={today}
          onDone={() => {
            setIsOpen(false);
            void refetch();
          }}
        />
      ) : null}
    </div>
  );
}

function DaysOffForm({
  person,
  today,
  onDone,
}: {
  person: DaysOffProps['person'];
  today: string;
  onDone: () => void;
}) {
  const [days, setDays] = useState({ firstDay: '', lastDay: '', reason: '' });
  const change = useTriedChange<Omit<AddDaysOffInput, 'isTrial'>>(addDaysOff, () => {
    showToast({ text: `${person.name} is off.` });
    onDone();
  });
  function submit(event: FormEvent) {
    event.preventDefault();
    change.save({ personId: person.id, ...days, lastDay: days.lastDay || days.firstDay });
  }
  return (
    <form
      onSubmit={submit}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && change.outside === null) onDone();
      }}
      className="ml-3.5 flex flex-col gap-2 border border-rule bg-sheet p-3"
    >
      <div className="grid gap-3 sm:grid-cols-3">
        <TextField
          label="First day"
          type="date"
          required
          autoFocus
          min={today}
          value={days.firstDay}
          error={change.problem?.errors?.firstDay}
          onChange={(event) => setDays({ ...days, firstDay: event.target.value })}
        />
        <TextField
          label="Last day"
          type="date"
          isOptional
          min={days.firstDay || today}
          value={days.lastDay}
          error={change.problem?.errors?.lastDay}
          onChange={(event) => setDays({ ...days, lastDay: event.target.value })}
        />
        <TextField
          label="Why"
          isOptional
          autoComplete="off"
          hint="Seen by the office alone."
          value={days.reason}
          onChange={(event) => setDays({ ...days, reason: event.target.value })}
        />
      </div>
      <FormError problem={change.problem} shownFields={['firstDay', 'lastDay']} />
      <div className="flex gap-2">
        <Button type="submit" busyText={change.isBusy ? 'Saving…' : undefined}>
          Save the days off
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
