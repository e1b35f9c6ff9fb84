import Link from 'next/link';
import { Verdict } from '@/components/ui/verdict';
import { VerdictNote } from '@/components/ui/verdict-note';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Room } from '@/lib/contracts/wall-book';
import { suspectAdvice } from '@/lib/drawing/closure-words';
import type { Fit } from '@/lib/measure/fit';
import type { RunFill, RunFit } from '@/lib/measure/run-fit';
import { ruleBehind } from '@/lib/sheet/rule-behind';
import { InFractions } from './in-fractions';
import { RuleLine } from './rule-line';
import { RunVerdict } from './run-verdict';

type VerdictListProps = {
  fit: Fit;
  room: Room;
  rules: FitRules;
  /** Where a wall with its runs is shown. */
  wallHref: (wallId: string) => string;
};

/** What the fit says about the room, worst first, each with the rule that says so. */
export function VerdictList({ fit, room, rules, wallHref }: VerdictListProps) {
  const loud = fit.verdicts.filter(({ verdict }) => verdict !== 'within');
  const quiet = fit.verdicts.length - loud.length;
  const errors = fit.problems.filter(({ severity }) => severity === 'error');
  const warnings = fit.problems.filter(({ severity }) => severity === 'warning');
  const { suspect } = fit.closure;
  return (
    <div className="flex flex-col gap-2 py-3">
      {suspect ? (
        <VerdictNote kind="problem" word="suspect">
          <InFractions words={suspectAdvice(fit, room, rules) ?? suspect.words} />
        </VerdictNote>
      ) : null}
      {errors.map(({ code, message, about }) => (
        <VerdictNote key={`${code} ${about.join()}`} kind="problem" word="cannot be">
          <InFractions words={message} />
        </VerdictNote>
      ))}
      <ul>
        {fit.runs.map((run) =>
          run.fill && run.fill.verdict !== 'fits' ? (
            <RunLine key={run.runId} run={run} fill={run.fill} href={wallHref(run.wallId)} />
          ) : null,
        )}
        {loud.map((verdict) => (
          <li
            key={`${verdict.check} ${verdict.words}`}
            className="grid grid-cols-[5.5rem_minmax(0,1fr)] gap-x-2 border-b border-rule py-1.5"
          >
            <Verdict kind={verdict.verdict} className="self-start">
              {verdict.inDoubt ? `${verdict.verdict}?` : verdict.verdict}
            </Verdict>
            <div>
              <InFractions words={verdict.words} />
              {verdict.inDoubt ? ' Its ± spans the limit.' : ''}
              <span className="block text-note text-graphite">{verdict.action}</span>
              <RuleLine by={ruleBehind(verdict, rules)} />
            </div>
          </li>
        ))}
      </ul>
      {warnings.length > 0 ? (
        <details>
          <summary className="text-graphite">
            {warnings.length === 1 ? 'One thing to know' : `${warnings.length} things to know`}
          </summary>
          <ul className="list-disc pl-5">
            {warnings.map(({ code, message, about }) => (
              <li key={`${code} ${about.join()}`}>
                <InFractions words={message} />
              </li>
            ))}
          </ul>
        </details>
      ) : null}
      {quiet > 0 ? (
        <p className="text-graphite">
          {loud.length === 0 && !suspect && errors.length === 0
            ? `All ${quiet} checks of the room are within their rules.`
            : `${quiet} more checks of the room are within their rules.`}
        </p>
      ) : null}
    </div>
  );
}

/** A run that does not come out, and the way to its wall, where the change of widths can be taken. */
function RunLine({ run, fill, href }: { run: RunFit; fill: RunFill; href: string }) {
  return (
    <li className="grid grid-cols-[5.5rem_minmax(0,1fr)] gap-x-2 border-b border-rule py-1.5">
      <RunVerdict verdict={fill.verdict} className="self-start" />
      <div>
        {run.name}: <InFractions words={fill.words} />{' '}
        <Link href={href} scroll={false} className="link">
          {fill.suggestion?.possible ? 'See the way out' : 'See its wall'}
        </Link>
      </div>
    </li>
  );
}
