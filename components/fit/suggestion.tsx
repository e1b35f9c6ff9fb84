import { Verdict } from '@/components/ui/verdict';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { RunFit, WidthSuggestion } from '@/lib/measure/run-fit';
import { roundedMm } from '@/lib/sheet/figure-text';
import { unitWords } from '@/lib/sheet/unit-words';
import { formatLength } from '@/lib/units/format-length';
import { InFractions } from './in-fractions';
import { RunVerdict } from './run-verdict';

type SuggestionProps = {
  run: Run;
  suggestion: WidthSuggestion;
  before: RunFit;
  /** The fit of the run with the suggested widths. */
  after: RunFit;
  rules: FitRules;
};

/** The smallest change of widths that makes the fillers come out, before and after side by side. */
export function Suggestion({ run, suggestion, before, after, rules }: SuggestionProps) {
  const length = (mm: number) => formatLength(mm, rules);
  if (!suggestion.possible) {
    return (
      <p className="py-2">
        <Verdict kind="over" className="mr-2">
          no way out
        </Verdict>
        <InFractions words={suggestion.words} />
      </p>
    );
  }
  const face = (fit: RunFit, side: 'left' | 'right') => {
    const { filler, freeRoom } = fit[side];
    if (filler) return `${length(roundedMm(filler.least, rules.stepMm))} at least`;
    return freeRoom ? `${length(roundedMm(freeRoom, rules.stepMm))} free` : 'none';
  };
  const rows: [what: string, now: string, then: string][] = [
    ...suggestion.changes.map(({ unitId, fromMm, toMm }): [string, string, string] => {
      const place = run.units.findIndex(({ id }) => id === unitId);
      const unit = run.units[place];
      return [
        `${place + 1}: ${unit ? unitWords(unit, rules.region) : 'unit'}`,
        length(fromMm),
        length(toMm),
      ];
    }),
    ['Left filler', face(before, 'left'), face(after, 'left')],
    ['Right filler', face(before, 'right'), face(after, 'right')],
  ];
  return (
    <table className="w-full border-collapse">
      <caption className="py-1 text-left">
        <InFractions words={suggestion.words} />
      </caption>
      <thead>
        <tr className="border-b border-ink text-note text-graphite">
          <th scope="col" className="py-1 text-left font-normal">
            <span className="sr-only">what</span>
          </th>
          <th scope="col" className="px-2 text-right font-normal">
            as laid out
          </th>
          <th scope="col" className="pl-2 text-right font-normal">
            with this change
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(([what, now, then]) => (
          <tr key={what} className="border-b border-rule">
            <th scope="row" className="py-1 text-left font-normal">
              {what}
            </th>
            <td className="px-2 text-right text-graphite">
              <InFractions words={now} />
            </td>
            <td className="pl-2 text-right font-bold">
              <InFractions words={then} />
            </td>
          </tr>
        ))}
        <tr>
          <th scope="row" className="py-1 text-left font-normal">
            Verdict
          </th>
          <td className="px-2 text-right">
            {before.fill ? <RunVerdict verdict={before.fill.verdict} /> : null}
          </td>
          <td className="pl-2 text-right">
            {after.fill ? <RunVerdict verdict={after.fill.verdict} /> : null}
          </td>
        </tr>
      </tbody>
    </table>
  );
}
