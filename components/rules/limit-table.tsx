import type { OwnRuleSet } from '@/lib/contracts/rule-sets';
import { limitRows, spanWords, withLimit } from '@/lib/measure/rules/copy-rule-set';
import type { Rule, RuleSet } from '@/lib/measure/rules/rule-set';
import { checkWords } from '@/lib/rules/check-words';
import { fineLength } from '@/lib/sheet/reading-words';
import type { Region } from '@/lib/words/trade';

import { LimitField } from './limit-field';

type LimitTableProps = {
  set: RuleSet;
  unit: 'in' | 'mm';
  region: Region;
  /** The shop's own copy, when this is one: its figures can be typed over. */
  editable: OwnRuleSet | null;
  onChange: (changed: OwnRuleSet) => void;
};

/** Each limit with where it was published; in a copy, each figure can be typed over. */
export function LimitTable({ set, unit, region, editable, onChange }: LimitTableProps) {
  return (
    <div className="overflow-x-auto">
      <table className="w-full">
        <thead>
          <tr className="border-b border-ink text-left text-note text-graphite">
            <th scope="col" className="py-1 pr-4 font-medium">
              What is checked
            </th>
            <th scope="col" className="py-1 pr-4 font-medium">
              Limit
            </th>
            <th scope="col" className="py-1 font-medium">
              Source
            </th>
          </tr>
        </thead>
        <tbody>
          {set.rules.map((rule, at) => (
            <tr
              key={`${rule.check}-${rule.overMm}`}
              className="border-b border-rule align-baseline"
            >
              <th scope="row" className="py-1.5 pr-4 text-left font-medium">
                {checkWords(rule.check, region)}
                {rule.overMm ? (
                  <span className="font-normal text-graphite">
                    {' '}
                    over {spanWords(rule.overMm, unit)}
                  </span>
                ) : null}
              </th>
              <td className="py-1.5 pr-8">
                {limitRows(rule.limit, unit).map(({ limitMm, words }, row) => (
                  <div
                    key={words}
                    className="flex items-baseline gap-2 whitespace-nowrap tabular-nums"
                  >
                    <span className="text-graphite">
                      {rule.sense === 'least' ? 'at least' : 'at most'}
                    </span>
                    {editable ? (
                      <LimitField
                        label={`${checkWords(rule.check, region)} ${words}`.trim()}
                        limitMm={limitMm}
                        unit={unit}
                        onChange={(typed) => onChange(withLimit(editable, at, typed, row))}
                      />
                    ) : (
                      <span>{fineLength(limitMm, unit)}</span>
                    )}
                    {words}
                  </div>
                ))}
              </td>
              <td className="py-1.5 text-graphite">
                <Source rule={rule} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Source({ rule }: { rule: Rule }) {
  const words = [rule.source, rule.edition, rule.clause].filter(Boolean).join(', ');
  return rule.address ? (
    <a className="link" href={rule.address} rel="noreferrer" target="_blank">
      {words}
    </a>
  ) : (
    words
  );
}
