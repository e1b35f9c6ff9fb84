import { VerdictNote } from '@/components/ui/verdict-note';
import type { Fit } from '@/lib/measure/fit';
import { ruleWords } from '@/lib/sheet/proof-rows';
import { InFractions } from './in-fractions';

/** What the fit says about the room, worst first; what is within its rule is counted. */
export function VerdictList({ fit }: { fit: Fit }) {
  const loud = fit.verdicts.filter(({ verdict }) => verdict !== 'within');
  const quiet = fit.verdicts.length - loud.length;
  const errors = fit.problems.filter(({ severity }) => severity === 'error');
  const warnings = fit.problems.filter(({ severity }) => severity === 'warning');
  const { suspect } = fit.closure;
  return (
    <div className="flex flex-col gap-2 py-3">
      {suspect ? (
        <VerdictNote kind="problem" word="suspect">
          <InFractions words={suspect.words} />
          <ul className="mt-1">
            {fit.closure.settle.slice(0, 2).map((step) => (
              <li key={step.slot}>
                To settle it: <InFractions words={step.words} />
              </li>
            ))}
          </ul>
        </VerdictNote>
      ) : null}
      {errors.map(({ code, message, about }) => (
        <VerdictNote key={`${code} ${about.join()}`} kind="problem" word="cannot be">
          <InFractions words={message} />
        </VerdictNote>
      ))}
      {loud.map((verdict) => (
        <VerdictNote
          key={`${verdict.check} ${verdict.words}`}
          kind={verdict.verdict}
          word={verdict.inDoubt ? `${verdict.verdict}, in doubt` : undefined}
        >
          <InFractions words={verdict.words} />
          <span className="block text-note text-graphite">
            {verdict.action ? `${verdict.action} ` : ''}
            {ruleWords(verdict)}
          </span>
        </VerdictNote>
      ))}
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
            ? `All ${quiet} checks are within their rules.`
            : `${quiet} more checks are within their rules.`}
        </p>
      ) : null}
    </div>
  );
}
