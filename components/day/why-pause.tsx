import { Button } from '@/components/ui/button';
import type { PauseReason } from '@/lib/contracts/day-events';
import { useCrew } from './crew-language';

const reasons: PauseReason[] = ['break', 'parts', 'for-the-day', 'other'];

type WhyPauseProps = { onSay: (why: PauseReason) => void; onLeave: () => void };

/** Work rests: for a break, for parts, or until tomorrow. */
export function WhyPause({ onSay, onLeave }: WhyPauseProps) {
  const { words } = useCrew();
  return (
    <fieldset>
      <legend className="mb-2 font-bold">{words.pauseWhy}</legend>
      <div className="grid grid-cols-2 gap-2">
        {reasons.map((why) => (
          <Button key={why} size="thumb" look="line" onClick={() => onSay(why)}>
            {words.pauses[why]}
          </Button>
        ))}
      </div>
      <Button className="mt-2" size="thumb" look="plain" onClick={onLeave}>
        {words.back}
      </Button>
    </fieldset>
  );
}
