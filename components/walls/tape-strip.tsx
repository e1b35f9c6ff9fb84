'use client';

import { memo } from 'react';
import { FractionText } from '@/components/ui/fraction-text';
import { spokenInches } from '@/lib/units/spoken-inches';
import type { TapeTick } from '@/lib/walls-pad/tape-ticks';
import { tapeTicks } from '@/lib/walls-pad/tape-ticks';

type TapeStripProps = {
  stepMm: number;
  sixtyFourths: number;
  onTick: (sixtyFourths: number) => void;
};

/**
 * An inch of tape with two edges, as tapes have: eighths along the upper one, and along the lower one, half
 * a step to the right, the sixteenths between them. Each lies over its true place, and any sixteenth is one
 * touch of a target an eighth wide.
 */
export const TapeStrip = memo(function TapeStrip({ stepMm, sixtyFourths, onTick }: TapeStripProps) {
  const { eighths, sixteenths } = tapeTicks(stepMm);
  return (
    <fieldset className="border-y border-ink bg-tape" aria-label="Fraction of an inch">
      <TickRow ticks={eighths} isUpper {...{ sixtyFourths, onTick }} />
      {sixteenths.length > 0 ? (
        <TickRow ticks={sixteenths} isUpper={false} {...{ sixtyFourths, onTick }} />
      ) : null}
    </fieldset>
  );
});

/** Eight eighths and half of one: both rows fit. */
const ACROSS = 8.5;
/** Length of a printed tick by its fraction, in px: the longer, the coarser. */
const tickLength: Record<number, number> = { 1: 22, 2: 18, 4: 14, 8: 10, 16: 10 };

type TickRowProps = {
  ticks: TapeTick[];
  isUpper: boolean;
  sixtyFourths: number;
  onTick: (sixtyFourths: number) => void;
};

function TickRow({ ticks, isUpper, sixtyFourths, onTick }: TickRowProps) {
  return (
    <div
      className="grid h-14 grid-cols-8"
      style={{
        width: `${(8 / ACROSS) * 100}%`,
        marginLeft: `${((isUpper ? 0 : 0.5) / ACROSS) * 100}%`,
      }}
    >
      {ticks.map((tick) => {
        const isOn = tick.sixtyFourths === sixtyFourths;
        return (
          <button
            key={tick.sixtyFourths}
            type="button"
            aria-pressed={isOn}
            aria-label={tick.numerator === 0 ? 'no fraction' : spokenInches(fractionOf(tick))}
            onClick={() => onTick(tick.sixtyFourths)}
            className={`flex touch-manipulation items-center gap-1 leading-none font-bold select-none ${
              isUpper ? 'flex-col text-lead' : 'flex-col-reverse text-body'
            } ${isOn ? 'bg-pine text-on-fill' : 'active:bg-tint'}`}
          >
            <span
              aria-hidden="true"
              style={{ height: tickLength[tick.denominator] ?? 10 }}
              className={`w-0.5 ${isOn ? 'bg-on-fill' : 'bg-ink'}`}
            />
            <span className="flex flex-1 items-center">
              {tick.numerator === 0 ? '0' : <FractionText {...fractionOf(tick)} />}
            </span>
          </button>
        );
      })}
    </div>
  );
}

function fractionOf({ numerator, denominator }: TapeTick) {
  return { negative: false, whole: 0, numerator, denominator };
}
