'use client';

import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { ChangeClosedDaysInput, CrewsView } from '@/lib/contracts/crews';
import { AskOutside } from './ask-outside';
import { changeClosedDays, useRefetchCrews } from './crews-query';
import { useTriedChange } from './use-tried-change';

/** The days on which nobody goes out: the shop's own, and the public holidays that it keeps. */
export function ClosedDays({ view, mayChange }: { view: CrewsView; mayChange: boolean }) {
  const refetch = useRefetchCrews();
  const [day, setDay] = useState('');
  const change = useTriedChange<Omit<ChangeClosedDaysInput, 'isTrial'>>(changeClosedDays, () => {
    setDay('');
    void refetch();
  });
  const { closedDays, holidays, publicHolidays, holidayPlaces, today } = view;
  const coming = closedDays.filter((date) => date >= today);
  const place = holidayPlaces.find(({ country }) => country === holidays?.country);

  function addDay(event: FormEvent) {
    event.preventDefault();
    if (day) change.save({ closedDays: [...closedDays, day] });
  }
  function choose(country: string, part: string) {
    const isSame = holidays?.country === country && holidays.part === part;
    const worked = isSame ? holidays.worked : [];
    change.save({ holidays: country ? { country, part, worked } : null });
  }
  function keepDay(date: string, isKept: boolean) {
    if (!holidays) return;
    const others = holidays.worked.filter((one) => one !== date);
    change.save({ holidays: { ...holidays, worked: isKept ? others : [...others, date] } });
  }

  return (
    <fieldset disabled={!mayChange} className="flex flex-col gap-4">
      <div className="grid gap-3 sm:grid-cols-2">
        <SelectField
          label="Public holidays"
          emptyLabel="none: the shop works them"
          value={holidays?.country ?? ''}
          options={holidayPlaces.map(({ country, name }) => ({ value: country, label: name }))}
          onChange={(event) => choose(event.target.value, '')}
        />
        {place && place.parts.length > 0 ? (
          <SelectField
            label="And those of"
            emptyLabel={`all of ${place.name}`}
            value={holidays?.part ?? ''}
            options={place.parts.map(({ part, name }) => ({ value: part, label: name }))}
            onChange={(event) => choose(place.country, event.target.value)}
          />
        ) : null}
      </div>
      {publicHolidays.length > 0 ? (
        <ul className="columns-1 gap-8 md:columns-2">
          {publicHolidays.map(({ date, name, words, isWorked }) => (
            <li key={date} className="break-inside-avoid">
              <CheckField
                label={`${words}: ${name}`}
                checked={!isWorked}
                onChange={(event) => keepDay(date, event.target.checked)}
              />
            </li>
          ))}
        </ul>
      ) : null}
      <div>
        <p className="font-medium">The shop&rsquo;s own closed days</p>
        <ul className="flex flex-wrap gap-x-4">
          {coming.length === 0 ? <li className="text-graphite">none to come</li> : null}
          {coming.map((date) => (
            <li key={date} className="flex items-center tabular-nums">
              {date}
              {mayChange ? (
                <Button
                  look="plain"
                  aria-label={`Work on ${date} after all`}
                  onClick={() =>
                    change.save({ closedDays: closedDays.filter((one) => one !== date) })
                  }
                >
                  Take it back
                </Button>
              ) : null}
            </li>
          ))}
        </ul>
      </div>
      {mayChange ? (
        <form onSubmit={addDay} className="flex items-end gap-2">
          <TextField
            label="Close the shop on"
            type="date"
            min={today}
            required
            value={day}
            onChange={(event) => setDay(event.target.value)}
          />
          <Button type="submit" look="line" busyText={change.isBusy ? 'Saving…' : undefined}>
            Close it
          </Button>
        </form>
      ) : null}
      <FormError problem={change.problem} />
      <AskOutside
        outside={change.outside}
        isBusy={change.isBusy}
        onKeep={change.keepAnyway}
        onLetBe={change.letBe}
      />
    </fieldset>
  );
}
