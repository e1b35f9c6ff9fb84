import { TitleBlock } from '@/components/ui/title-block';
import type { BookingRules } from '@/lib/contracts/shop-rules';
import { bookingRuleBasis } from '@/lib/measure/rules/default-basis';
import { type ErrorOf, RuleField } from './rule-field';

const fields = [
  { name: 'weightDriveMinute', label: 'A minute driven' },
  { name: 'weightDayWaited', label: 'A day waited' },
  { name: 'weightScrapMinute', label: 'A minute nobody can use' },
  { name: 'weightMissedWish', label: 'A wish missed' },
] as const;

type OpeningWeightsProps = { booking: BookingRules; errorOf: ErrorOf };

/** What counts as how much trouble when times that work are put in order. */
export function OpeningWeights({ booking, errorOf }: OpeningWeightsProps) {
  return (
    <section>
      <TitleBlock
        title="Times that work"
        meta="in minutes of trouble; the least is offered first"
      />
      {fields.map(({ name, label }) => (
        <RuleField
          key={name}
          label={label}
          hint={bookingRuleBasis[name].note.replace(' Common practice, no source.', '')}
          name={name}
          type="number"
          step="any"
          min={0}
          defaultValue={booking[name]}
          errorOf={errorOf}
        />
      ))}
    </section>
  );
}
