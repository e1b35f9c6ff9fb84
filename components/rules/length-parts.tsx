import { SelectField } from '@/components/ui/select-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { fitRuleBasis } from '@/lib/measure/rules/default-basis';
import {
  lengthListRules,
  lengthRuleGroups,
  shownLength,
  shownLengths,
} from '@/lib/rules/length-rules';
import { tradeName } from '@/lib/words/trade';
import { type ErrorOf, RuleField } from './rule-field';

type LengthPartsProps = { fit: FitRules; errorOf: ErrorOf };

/** The shop's own lengths by subject, typed in its own unit, each with where its start value comes from. */
export function LengthParts({ fit, errorOf }: LengthPartsProps) {
  const unit = fit.unit === 'in' ? 'inches' : 'mm';
  return (
    <>
      {lengthRuleGroups(fit.region).map(({ title, rules }) => (
        <section key={title}>
          <TitleBlock title={title} meta={unit} />
          {rules.map(({ rule, label, affects, isFine }) => (
            <RuleField
              key={rule}
              label={label}
              hint={`moves ${affects}. ${fitRuleBasis[rule].note}`}
              name={rule}
              defaultValue={shownLength(fit[rule], fit, isFine)}
              errorOf={errorOf}
            />
          ))}
        </section>
      ))}
      <section>
        <TitleBlock title="Reading a room" meta={`${unit}, commas between`} />
        {lengthListRules.map(({ rule, label, affects }) => (
          <RuleField
            key={rule}
            label={label}
            hint={`moves ${affects}. ${fitRuleBasis[rule].note}`}
            name={rule}
            className="text-left"
            defaultValue={shownLengths(fit[rule], fit)}
            errorOf={errorOf}
          />
        ))}
        <div className="py-2">
          <SelectField
            label={`${tradeName('filler', fit.region)}s are flush with`}
            name="fillerPlane"
            hint={fitRuleBasis.fillerPlane.note}
            defaultValue={fit.fillerPlane}
            options={[
              { value: 'door-front', label: 'the doors’ fronts' },
              { value: 'carcass-front', label: 'the boxes’ fronts (the frame)' },
            ]}
          />
        </div>
      </section>
    </>
  );
}
