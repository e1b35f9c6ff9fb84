import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { RuleBehind } from '@/lib/sheet/rule-behind';
import { FractionWords } from './fraction-words';

/** The rule that judged a reading, whole: limit, source, clause, what to do. */
export function RuleSheet({ by, onBack }: { by: RuleBehind; onBack: () => void }) {
  return (
    <section className="flex flex-1 flex-col gap-3 px-3.5 py-4">
      <TitleBlock level={1} title="Whose rule it is" />
      <p className="text-lead">
        <FractionWords>{by.short}</FractionWords>
      </p>
      <dl className="divide-y divide-rule border-y border-rule">
        {by.details.map(({ label, words }) => (
          <div key={label} className="py-2">
            <dt className="text-note text-graphite">{label}</dt>
            <dd>
              <FractionWords>{words}</FractionWords>
            </dd>
          </div>
        ))}
      </dl>
      {by.address ? <p className="text-note text-graphite">Read at {by.address}</p> : null}
      <Button size="thumb" look="line" className="mt-auto" onClick={onBack}>
        Back to the reading
      </Button>
    </section>
  );
}
