import { TextField } from '@/components/ui/text-field';
import type { BookingRules } from '@/lib/contracts/shop-rules';

const fields = [
  { name: 'weightDriveMinute', label: 'A minute driven' },
  { name: 'weightDayWaited', label: 'A day waited' },
  { name: 'weightScrapMinute', label: 'A minute nobody can use' },
  { name: 'weightMissedWish', label: 'A wish missed' },
] as const;

/** What counts as how much trouble when times that work are put in order. */
export function OpeningWeights({
  booking,
  errorOf,
}: {
  booking: BookingRules;
  errorOf: (field: string) => string | undefined;
}) {
  return (
    <fieldset className="flex flex-col gap-2">
      <legend className="font-medium">Times that work: what counts as minutes of trouble</legend>
      <p className="text-graphite text-note">The time with the least trouble is offered first.</p>
      <div className="grid grid-cols-2 gap-3 sm:grid-cols-4">
        {fields.map(({ name, label }) => (
          <TextField
            key={name}
            label={label}
            name={name}
            type="number"
            step="any"
            min={0}
            defaultValue={booking[name]}
            error={errorOf(`booking.${name}`)}
          />
        ))}
      </div>
    </fieldset>
  );
}
