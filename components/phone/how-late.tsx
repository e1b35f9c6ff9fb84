import { Button } from '@/components/ui/button';

const minutes = [15, 30, 45, 60, 90, 120] as const;

/** How long after the promised window: one tap, and the customer and the office are told. */
export function HowLate({
  onSay,
  onLeave,
}: {
  onSay: (lateMinutes: number) => void;
  onLeave: () => void;
}) {
  return (
    <fieldset>
      <legend className="mb-2 font-bold">Later than the promised window, by about</legend>
      <div className="grid grid-cols-3 gap-2">
        {minutes.map((count) => (
          <Button key={count} size="thumb" look="line" onClick={() => onSay(count)}>
            {count < 60 ? `${count} min` : `${count / 60} h`.replace('1.5', '1½')}
          </Button>
        ))}
      </div>
      <Button className="mt-2 w-full" size="thumb" look="line" onClick={onLeave}>
        Not late after all
      </Button>
    </fieldset>
  );
}
