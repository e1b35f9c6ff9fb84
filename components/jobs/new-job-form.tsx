'use client';

import { useRouter } from 'next/navigation';
import { useRef, useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import type { MapGround } from '@/components/map/map-day';
import { PlaceField } from '@/components/place/place-field';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { JobRow } from '@/lib/contracts/jobs';
import { apiPaths, paths } from '@/lib/paths';
import type { LatLon } from '@/lib/travel/place';
import { newJobBody } from './new-job-body';

/** The call that starts it all, in the order in which a caller tells it. */
export function NewJobForm({ ground }: { ground: MapGround }) {
  const router = useRouter();
  const madeId = useRef('');
  const formRef = useRef<HTMLFormElement>(null);
  const [place, setPlace] = useState<LatLon | null>(null);
  const form = useFormRequest(
    async (fields) => {
      madeId.current = (
        await askServer<Pick<JobRow, 'id'>>(apiPaths.jobs(), { body: newJobBody(fields, place) })
      ).id;
    },
    () => router.push(paths.job(madeId.current)),
  );
  const error = form.errorOf;
  return (
    <form
      ref={formRef}
      onSubmit={form.submit}
      className="mt-5 grid max-w-page gap-8 lg:grid-cols-3"
    >
      <fieldset className="flex flex-col gap-3">
        <legend className="contents">
          <TitleBlock title="Who" level={3} />
        </legend>
        <TextField
          label="Customer"
          name="name"
          autoComplete="off"
          required
          autoFocus
          error={error('customer.name')}
        />
        <TextField
          label="Phone"
          name="phone"
          type="tel"
          autoComplete="off"
          isOptional
          error={error('customer.phone')}
        />
        <CheckField label="May be texted (asked, and said yes)" name="mayText" value="yes" />
        <TextField
          label="E-mail"
          name="email"
          type="email"
          autoComplete="off"
          isOptional
          error={error('customer.email')}
        />
        <CheckField
          label="May be e-mailed (asked, and said yes)"
          hint="With neither, nobody is told by itself: you call them."
          name="mayEmail"
          value="yes"
        />
        <SelectField
          label="Language"
          name="language"
          options={[
            { value: 'en', label: 'English' },
            { value: 'es', label: 'Spanish' },
          ]}
        />
      </fieldset>
      <fieldset className="flex flex-col gap-3">
        <legend className="contents">
          <TitleBlock title="Where" level={3} />
        </legend>
        <TextField
          label="Street and number"
          name="street"
          autoComplete="off"
          required
          error={error('site.street')}
        />
        <div className="grid grid-cols-[1fr_8rem] gap-3">
          <TextField label="Town" name="town" autoComplete="off" error={error('site.town')} />
          <TextField
            label="Postcode"
            name="postcode"
            autoComplete="off"
            error={error('site.postcode')}
          />
        </div>
        <PlaceField
          addressOf={() => addressIn(formRef.current)}
          place={place}
          ground={ground}
          onChange={setPlace}
        />
        <TextareaField
          label="Way in"
          name="wayIn"
          hint="Door, parking, stairs. No codes or keys here."
          error={error('site.wayIn')}
        />
        <div className="grid grid-cols-2 gap-3">
          <TextField
            label="Floors up"
            name="floorsUp"
            type="number"
            defaultValue="0"
            error={error('site.floorsUp')}
          />
          <TextField
            label="Year built"
            name="yearBuilt"
            type="number"
            isOptional
            error={error('site.yearBuilt')}
          />
        </div>
        <CheckField label="There is a lift" name="hasLift" value="yes" />
      </fieldset>
      <fieldset className="flex flex-col gap-3">
        <legend className="contents">
          <TitleBlock title="What" level={3} />
        </legend>
        <TextField
          label="The job"
          name="title"
          placeholder="Kitchen, L, 11 units"
          required
          error={error('title')}
        />
        <div className="grid grid-cols-2 gap-3">
          <TextField
            label="Rooms"
            name="roomCount"
            type="number"
            min={1}
            defaultValue="1"
            error={error('roomCount')}
          />
          <TextField
            label="Units, about"
            name="unitCount"
            type="number"
            min={0}
            defaultValue="0"
            error={error('unitCount')}
          />
        </div>
        <SelectField
          label="Walls"
          name="wallsReady"
          options={[
            { value: 'closed', label: 'closed, ready to measure' },
            { value: 'bare-studs', label: 'bare studs' },
            { value: 'not-yet', label: 'not up yet' },
          ]}
        />
        <TextField
          label="Site ready on"
          name="siteReadyOn"
          type="date"
          isOptional
          error={error('siteReadyOn')}
        />
        <TextareaField label="Notes" name="notes" error={error('notes')} />
      </fieldset>
      <div className="flex flex-col items-start gap-3 lg:col-span-3">
        <FormError problem={form.problem} shownFields={shownFields} />
        <Button type="submit" busyText={form.isBusy ? 'Saving…' : undefined}>
          Save the job
        </Button>
      </div>
    </form>
  );
}

/** The address as it is typed so far. */
function addressIn(form: HTMLFormElement | null) {
  const fields = form ? new FormData(form) : new FormData();
  const text = (name: string) => String(fields.get(name) ?? '');
  return { street: text('street'), town: text('town'), postcode: text('postcode') };
}

const shownFields = [
  'customer.name',
  'customer.phone',
  'customer.email',
  'site.street',
  'site.town',
  'site.postcode',
  'site.wayIn',
  'site.floorsUp',
  'site.yearBuilt',
  'title',
  'roomCount',
  'unitCount',
  'siteReadyOn',
  'notes',
];
