import type { RuleBehind } from '@/lib/sheet/rule-behind';
import { InFractions } from './in-fractions';

/** One short line, whose rule it is; opened, the whole of it. On paper the short line stands alone. */
export function RuleLine({ by }: { by: RuleBehind }) {
  return (
    <details className="text-note text-graphite">
      <summary>
        <InFractions words={by.short} />
      </summary>
      <dl className="my-1 border-l border-rule pl-3">
        {by.details.map(({ label, words }) => (
          <div key={label} className="flex gap-x-2">
            <dt className="w-18 shrink-0">{label}</dt>
            <dd className="text-ink">
              <InFractions words={words} />
            </dd>
          </div>
        ))}
        {by.address ? (
          <div className="flex gap-x-2">
            <dt className="w-18 shrink-0">Read at</dt>
            <dd className="min-w-0 break-words">
              <a href={by.address} rel="noreferrer" target="_blank" className="link">
                {by.address.replace(/^https?:\/\//, '')}
              </a>
            </dd>
          </div>
        ) : null}
      </dl>
    </details>
  );
}
