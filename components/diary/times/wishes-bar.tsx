import { controlLook } from '@/components/ui/field-frame';
import { KeyHint } from '@/components/ui/key-hint';
import { weekdayWords } from '@/lib/time/text-locale';
import { halfToggled, type Wishes } from './wishes';

/** What the customer wishes, one press each while they are on the phone. */
export function WishesBar({
  wishes,
  isBooked,
  isMeasure,
  workdays,
  onChange,
}: {
  wishes: Wishes;
  /** There is a booked time that another may be sooner than. */
  isBooked: boolean;
  isMeasure: boolean;
  /** ISO weekdays that the shop works. */
  workdays: readonly number[];
  onChange: (wishes: Wishes) => void;
}) {
  const change = (part: Partial<Wishes>) => onChange({ ...wishes, ...part });
  const toggleHalf = (half: NonNullable<Wishes['half']>) => change(halfToggled(wishes, half));
  const toggleDay = (day: number) =>
    change({
      weekdays: wishes.weekdays.includes(day)
        ? wishes.weekdays.filter((other) => other !== day)
        : [...wishes.weekdays, day].sort(),
    });
  return (
    <fieldset className="flex flex-col gap-2 border-b border-rule py-2">
      <legend className="sr-only">What the customer wishes</legend>
      <div className="flex flex-wrap gap-1">
        {workdays.map((day) => (
          <Toggle
            key={day}
            isOn={wishes.weekdays.includes(day)}
            onPress={() => toggleDay(day)}
            words={weekdayWords.en[day - 1] ?? ''}
          >
            {weekdayWords.en[day - 1]?.slice(0, 3)}
          </Toggle>
        ))}
        <Toggle isOn={wishes.half === 'morning'} onPress={() => toggleHalf('morning')} keyName="A">
          mornings
        </Toggle>
        <Toggle
          isOn={wishes.half === 'afternoon'}
          onPress={() => toggleHalf('afternoon')}
          keyName="P"
        >
          afternoons
        </Toggle>
        <Toggle
          isOn={wishes.isSchoolRun}
          onPress={() => change({ isSchoolRun: !wishes.isSchoolRun })}
        >
          not school run
        </Toggle>
        {isBooked ? (
          <Toggle
            isOn={wishes.isSooner}
            onPress={() => change({ isSooner: !wishes.isSooner })}
            keyName="S"
          >
            sooner
          </Toggle>
        ) : null}
        {isMeasure ? (
          <Toggle isOn={wishes.isForTwo} onPress={() => change({ isForTwo: !wishes.isForTwo })}>
            two people
          </Toggle>
        ) : null}
      </div>
      <div className="grid grid-cols-2 gap-2 text-note">
        <label className="flex flex-col text-graphite">
          From day
          <input
            type="date"
            className={`${controlLook} text-ink`}
            value={wishes.from}
            onChange={(event) => change({ from: event.target.value })}
          />
        </label>
        <label className="flex flex-col text-graphite">
          Not before
          <input
            type="time"
            step={900}
            className={`${controlLook} text-ink`}
            value={wishes.notBefore}
            onChange={(event) => change({ notBefore: event.target.value })}
          />
        </label>
      </div>
    </fieldset>
  );
}

function Toggle({
  isOn,
  words,
  keyName,
  onPress,
  children,
}: {
  isOn: boolean;
  words?: string;
  /** The key that does the same (use-times-keys). */
  keyName?: string;
  onPress: () => void;
  children: React.ReactNode;
}) {
  return (
    <button
      type="button"
      aria-pressed={isOn}
      aria-label={words}
      onClick={onPress}
      className={`inline-flex min-h-8 items-center gap-1.5 rounded border px-2 text-note max-lg:min-h-key max-lg:px-3 ${
        isOn
          ? 'border-pine bg-pine font-bold text-on-fill'
          : 'border-rule bg-sheet hover:border-ink'
      }`}
    >
      {children}
      {keyName ? <KeyHint keys={keyName} isOnFill={isOn} /> : null}
    </button>
  );
}
