'use client';

import { InFractions } from '@/components/fit/in-fractions';
import type { StopView } from '@/lib/contracts/stops';
import { type BringItem, whatToBring } from '@/lib/days/what-to-bring';
import { formatLength } from '@/lib/units/format-length';
import { unitIn } from '@/lib/words/unit-names';
import { type Crew, useCrew } from './crew-language';
import { ScreenFrame } from './screen-frame';

/** What to load before the first drive, worked out from the released sheets. */
export function BringScreen({ stop }: { stop: StopView }) {
  const crew = useCrew();
  const { words } = crew;
  const [first] = stop.sheets;
  if (!first) return <ScreenFrame title={words.bring}>{words.noSheet}</ScreenFrame>;
  const length = (mm: number) => formatLength(mm, first.rules);
  return (
    <ScreenFrame
      title={words.bring}
      meta={stop.finish ? `${words.finish}: ${stop.finish}` : undefined}
    >
      <ul className="divide-y divide-rule border-b border-rule">
        {whatToBring(stop.sheets, (unit) => unitIn(unit, crew)).map((item) => (
          <li key={JSON.stringify(item)} className="py-3 text-lead">
            <InFractions words={crew.say(itemWords(item, crew, length))} />
          </li>
        ))}
      </ul>
    </ScreenFrame>
  );
}

function itemWords(item: BringItem, { words }: Crew, length: (mm: number) => string): string {
  const { bringItems } = words;
  switch (item.what) {
    case 'filler':
      return bringItems.filler(item.count, length(item.lengthMm), length(item.widestMm));
    case 'kick':
      return bringItems.kick(length(item.lengthMm), length(item.tallestMm));
    case 'crown':
      return bringItems.crown(length(item.lengthMm));
    case 'legs':
      return bringItems.legs(item.count, length(item.leastMm), length(item.mostMm));
    case 'shims':
      return bringItems.shims(item.runs.join('; '));
    case 'backing':
      return bringItems.backing(item.units.join('; '));
    default:
      return bringItems[item.what];
  }
}
