import type { LengthUnit } from '@/lib/units/brands';
import { nudgedBy, withSixteenths } from './typed-length';

type TapeMarksProps = {
  /** The length that they change: "Mark to mark". */
  of: string;
  text: string;
  unit: LengthUnit;
  onText: (text: string) => void;
};

const eighths = ['0', '1/8', '1/4', '3/8', '1/2', '5/8', '3/4', '7/8'];
const look =
  'min-h-11 touch-manipulation border border-rule text-note hover:bg-tint active:bg-tint';

/** The fraction and the next mark of the tape by one touch, where a phone's keyboard makes a fraction four. */
export function TapeMarks({ of, text, unit, onText }: TapeMarksProps) {
  const mark = unit === 'in' ? '1/16' : '1 mm';
  return (
    <fieldset className="col-span-2 md:col-span-1">
      <legend className="pb-1 text-note text-graphite">{of}, by the tape</legend>
      <div className="grid grid-cols-8 gap-1 md:grid-cols-4">
        {unit === 'in'
          ? eighths.map((fraction, at) => (
              // A keyboard at hand types it as fast.
              <button
                key={fraction}
                type="button"
                aria-label={at === 0 ? 'no fraction' : `and ${fraction}`}
                className={`${look} pointer-fine:hidden ${at === 0 ? '' : 'diagonal-fractions'}`}
                onClick={() => onText(withSixteenths(text, at * 2))}
              >
                {fraction}
              </button>
            ))
          : null}
        {([-1, 1] as const).map((marks) => (
          <button
            key={marks}
            type="button"
            aria-label={`${mark} ${marks > 0 ? 'more' : 'less'}`}
            className={`${look} col-span-4 md:col-span-2`}
            onClick={() => onText(nudgedBy(text, unit, marks))}
          >
            {marks > 0 ? '+' : '−'}
            {mark}
          </button>
        ))}
      </div>
    </fieldset>
  );
}
