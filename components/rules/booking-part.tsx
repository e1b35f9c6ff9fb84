import Link from 'next/link';
import { CheckField } from '@/components/ui/check-field';
import { FieldError } from '@/components/ui/field-error';
import { TitleBlock } from '@/components/ui/title-block';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { bookingRuleBasis } from '@/lib/measure/rules/default-basis';
import { paths } from '@/lib/paths';
import { shownSpeed, speedUnit } from './drive-speed';
import { type ErrorOf, RuleField } from './rule-field';

const weekdays = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'];

type BookingPartProps = { settings: ShopSettings; errorOf: ErrorOf };

/** When the shop works, how long things take, and when customers may be told. */
export function BookingPart({ settings, errorOf }: BookingPartProps) {
  const { booking, keeping, region } = settings;
  return (
    <>
      <section>
        <TitleBlock
          title="Hours"
          meta={
            <Link href={paths.crews()} className="link">
              Holidays, closed days and crews’ own hours
            </Link>
          }
        />
        <RuleField
          label="Day starts"
          hint="moves times that are offered"
          name="dayStart"
          type="time"
          defaultValue={booking.dayStart}
          errorOf={errorOf}
        />
        <RuleField
          label="Day ends"
          hint="moves times that are offered, and over how many days an install goes"
          name="dayEnd"
          type="time"
          defaultValue={booking.dayEnd}
          errorOf={errorOf}
        />
        <fieldset className="border-b border-rule py-2">
          <legend className="contents font-medium">Days worked</legend>
          <div className="flex flex-wrap gap-x-5">
            {weekdays.map((day, index) => (
              <CheckField
                key={day}
                label={day}
                name={`workday${index + 1}`}
                value="yes"
                defaultChecked={booking.workdays.includes(index + 1)}
              />
            ))}
          </div>
          <FieldError error={errorOf('booking.workdays')} />
        </fieldset>
        <RuleField
          label="No texts from"
          hint={bookingRuleBasis.quietFrom.note}
          name="quietFrom"
          type="time"
          defaultValue={booking.quietFrom}
          errorOf={errorOf}
        />
        <RuleField
          label="No texts until"
          hint={`what waits goes out then. ${bookingRuleBasis.quietUntil.note}`}
          name="quietUntil"
          type="time"
          defaultValue={booking.quietUntil}
          errorOf={errorOf}
        />
      </section>
      <section>
        <TitleBlock title="Booking" meta="starts from common practice" />
        <RuleField
          label="Arrival window, minutes"
          hint={`moves what customers are promised. ${bookingRuleBasis.windowMinutes.note}`}
          name="windowMinutes"
          type="number"
          defaultValue={booking.windowMinutes}
          errorOf={errorOf}
        />
        <RuleField
          label="Release to ready, working days"
          hint={`moves when an install may be booked. ${bookingRuleBasis.leadWorkdays.note}`}
          name="leadWorkdays"
          type="number"
          defaultValue={booking.leadWorkdays}
          errorOf={errorOf}
        />
        <RuleField
          label="To measure a kitchen, minutes"
          hint={`moves how long a measure is booked for. ${bookingRuleBasis.measureMinutesPerRoom.note}`}
          name="measureMinutesPerRoom"
          type="number"
          defaultValue={booking.measureMinutesPerRoom}
          errorOf={errorOf}
        />
        <RuleField
          label="To set a unit, one person’s minutes"
          hint={`moves how long an install is booked for. ${bookingRuleBasis.installMinutesPerUnit.note}`}
          name="installMinutesPerUnit"
          type="number"
          defaultValue={booking.installMinutesPerUnit}
          errorOf={errorOf}
        />
        <RuleField
          label={`Drives go at, ${speedUnit(region)}`}
          hint="moves drive times where no road service answers"
          name="driveSpeed"
          type="number"
          step="any"
          defaultValue={shownSpeed(booking.driveKmPerHour, region)}
          errorOf={(field) => errorOf(field.replace('driveSpeed', 'driveKmPerHour'))}
        />
        <RuleField
          label="Forget a customer after, years"
          hint="moves names, addresses, photos and texts of jobs that are over so long. Empty: never by itself."
          name="customerYears"
          type="number"
          defaultValue={keeping?.customerYears ?? ''}
          errorOf={errorOf}
        />
      </section>
    </>
  );
}
