import { Button } from '@/components/ui/button';
import { useCrew } from './crew-language';

const minutes = [15, 30, 45, 60, 90, 120] as const;

type HowLateProps = { onSay: (lateMinutes: number) => void; onLeave: () => void };

/** How long after the promised window: one tap, and the customer and the office are told. */
export function HowLate({ onSay, onLeave }: HowLateProps) {
  const { words } = useCrew();
  return (
    <fieldset>
      <legend className="mb-2 font-bold">{words.howLate}</legend>
      <div className="grid grid-cols-3 gap-2">
        {minutes.map((count) => (
          <Button
            key={count}
            size="thumb"
            look="line"
            aria-label={words.lateMinutes(count)}
            onClick={() => onSay(count)}
          >
            {count < 60 ? `${count} min` : `${count / 60} h`.replace('1.5', '1½')}
          </Button>
        ))}
      </div>
      <Button className="mt-2" size="thumb" look="plain" onClick={onLeave}>
        {words.notLate}
      </Button>
    </fieldset>
  );
}
