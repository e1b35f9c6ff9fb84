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
 * An inch of tape. Two rows of touch: the eighths, and half a step to the right the sixteenths between
 * them, each over its true place, so that any sixteenth is one touch of a target an eighth wide.
 */
export const TapeStrip = memo(function TapeStrip({ stepMm, sixtyFourths, onTick }: TapeStripProps) {
  const { eighths, sixteenths } = tapeTicks(stepMm);
  return (
    <fieldset className="relative border-y border-ink bg-tape" aria-label="Fraction of an inch">
      <TickLines sixtyFourths={sixtyFourths} />
      <TickRow ticks={eighths} shift={0} {...{ sixtyFourths, onTick }} />
      {sixteenths.length > 0 ? (
        <TickRow ticks={sixteenths} shift={0.5} {...{ sixtyFourths, onTick }} />
      ) : null}
    </fieldset>
  );
});

const sixteenthsOnTape = Array.from({ length: 17 }, (_, count) => count);
/** Eight eighths and half of one: both rows fit. */
const ACROSS = 8.5;

function TickRow({
  ticks,
  shift,
  sixtyFourths,
  onTick,
}: {
  ticks: TapeTick[];
  shift: number;
  sixtyFourths: number;
  onTick: (sixtyFourths: number) => void;
}) {
  return (
    <div
      className="relative grid h-14 grid-cols-8"
      style={{
        width: `${(8 / ACROSS) * 100}%`,
        marginLeft: `${(shift / ACROSS) * 100}%`,
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
            className={`flex touch-manipulation items-end justify-center pb-1 text-lead leading-none font-bold select-none ${
              isOn ? 'bg-pine text-on-fill' : 'active:bg-tint'
            }`}
          >
            {tick.numerator === 0 ? '0' : <FractionText {...fractionOf(tick)} />}
          </button>
        );
      })}
    </div>
  );
}

/** The printed ticks, sixteenths of an inch from the middle of the first eighth's target. */
function TickLines({ sixtyFourths }: { sixtyFourths: number }) {
  return (
    <svg
      viewBox={`0 0 ${ACROSS * 16} 100`}
      preserveAspectRatio="none"
      aria-hidden="true"
      className="pointer-events-none absolute inset-0 z-10 size-full"
    >
      {sixteenthsOnTape.map((count) => {
        const x = 8 + count * 8;
        const height = count % 8 === 0 ? 26 : count % 4 === 0 ? 20 : count % 2 === 0 ? 15 : 10;
        const isOn = count * 4 === sixtyFourths;
        return (
          <path
            key={count}
            d={`M${x} 0V${height}`}
            vectorEffect="non-scaling-stroke"
            strokeWidth={isOn ? 4 : 1.5}
            className={isOn ? 'stroke-on-fill' : 'stroke-ink'}
          />
        );
      })}
    </svg>
  );
}

function fractionOf({ numerator, denominator }: TapeTick) {
  return { negative: false, whole: 0, numerator, denominator };
}
