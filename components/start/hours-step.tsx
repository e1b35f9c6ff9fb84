'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FieldError } from '@/components/ui/field-error';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { CrewsView } from '@/lib/contracts/crews';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { apiPaths, paths } from '@/lib/paths';

const days = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
/** Where most shops of a region are; of the others it is asked. */
const likelyCountry: Record<string, string> = { US: 'US', UK: 'GB', AU: 'AU' };

type HoursStepProps = { settings: ShopSettings; places: CrewsView['holidayPlaces'] };

/** The few rules that a first booking hangs on; all others start from common practice. */
export function HoursStep({ settings, places }: HoursStepProps) {
  const router = useRouter();
  const { booking, region, phone } = settings;
  const form = useFormRequest(
    async (fields) => {
      const { country } = fields;
      const kept = booking.holidays?.country === country ? booking.holidays : null;
      await askServer(apiPaths.rules(), {
        method: 'PATCH',
        body: {
          phone: fields.phone ?? '',
          booking: {
            ...booking,
            dayStart: fields.dayStart ?? booking.dayStart,
            dayEnd: fields.dayEnd ?? booking.dayEnd,
            workdays: days.flatMap((_, index) => (fields[`day${index + 1}`] ? [index + 1] : [])),
            holidays: country ? (kept ?? { country, part: '', worked: [] }) : null,
          },
        },
      });
    },
    () => {
      form.rest();
      router.refresh();
    },
  );
  const { errorOf } = form;
  return (
    <form onSubmit={form.submit} className="flex w-full max-w-form flex-col gap-3">
      <TextField
        label="The phone that customers may call"
        name="phone"
        type="tel"
        autoComplete="tel"
        defaultValue={phone}
        isOptional
        error={errorOf('phone')}
      />
      <div className="grid grid-cols-2 gap-3">
        <TextField
          label="Day starts"
          name="dayStart"
          type="time"
          defaultValue={booking.dayStart}
          error={errorOf('booking.dayStart')}
        />
        <TextField
          label="Day ends"
          name="dayEnd"
          type="time"
          defaultValue={booking.dayEnd}
          error={errorOf('booking.dayEnd')}
        />
      </div>
      <fieldset>
        <legend className="font-medium">Days worked</legend>
        <div className="flex flex-wrap gap-x-5">
          {days.map((day, index) => (
            <CheckField
              key={day}
              label={day}
              name={`day${index + 1}`}
              value="yes"
              defaultChecked={booking.workdays.includes(index + 1)}
            />
          ))}
        </div>
        <FieldError error={errorOf('booking.workdays')} />
      </fieldset>
      <SelectField
        label="Public holidays kept"
        name="country"
        defaultValue={booking.holidays?.country ?? likelyCountry[region] ?? ''}
        emptyLabel="none"
        options={places.map(({ country, name }) => ({ value: country, label: name }))}
        hint="States and single days: in Crews & people."
      />
      <FormError
        problem={form.problem}
        shownFields={['phone', 'booking.dayStart', 'booking.dayEnd', 'booking.workdays']}
      />
      <div className="flex flex-wrap items-center gap-x-5 gap-y-2">
        <Button type="submit" busyText={form.isBusy ? 'Saving…' : undefined}>
          These are our hours
        </Button>
        <Link href={paths.rules()} className="link">
          All other rules start from common practice
        </Link>
      </div>
    </form>
  );
}
