import Link from 'next/link';
import type { ReactNode } from 'react';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { OpeningPlace, RunFit } from '@/lib/measure/run-fit';
import { fillRuleBehind } from '@/lib/sheet/rule-behind';
import { tradeWord } from '@/lib/words/trade';
import { Figure } from './figure';
import { InFractions } from './in-fractions';
import { RuleLine } from './rule-line';
import { RunVerdict } from './run-verdict';

type RunSummaryProps = {
  runFit: RunFit;
  rules: FitRules;
  /** Where the run is laid out; absent where the person may not. */
  editHref?: string;
  /** In place of the words of a way out: the way itself, to be taken. */
  wayOut?: ReactNode;
};

/** What the room leaves a run: the largest plumb block and what governs it, slack, gap behind, verdict. */
export function RunSummary({ runFit, rules, editHref, wayOut }: RunSummaryProps) {
  const { clearOpening, fill, setLine, kicks } = runFit;
  return (
    <section className="border-b border-rule py-2.5 print:py-1">
      <h3 className="flex flex-wrap items-baseline gap-x-3">
        <span className="font-bold">{runFit.name}</span>
        {fill ? <RunVerdict verdict={fill.verdict} /> : null}
        {editHref ? (
          <Link href={editHref} scroll={false} className="link ml-auto">
            Lay it out
          </Link>
        ) : null}
      </h3>
      {fill ? (
        <p>
          <InFractions words={fill.words} />
        </p>
      ) : (
        <p className="text-graphite">Cannot be filled yet: its wall or a corner is not read.</p>
      )}
      {fill ? (
        <div className="print:hidden">
          <RuleLine by={fillRuleBehind(runFit, rules)} />
        </div>
      ) : null}
      {wayOut}
      {fill?.suggestion ? (
        <p className={wayOut ? 'hidden print:block' : undefined}>
          <span className="font-medium">
            {fill.suggestion.possible ? 'A way out: ' : 'No way out: '}
          </span>
          <InFractions words={fill.suggestion.words} />
        </p>
      ) : null}
      <dl className="mt-1 flex print:mt-0 flex-wrap gap-x-6 gap-y-0.5 text-note">
        {clearOpening ? (
          <Fact name="largest plumb block">
            <Figure
              figure={clearOpening.opening}
              of={`Clear opening, ${runFit.name}`}
              showsSurely
            />
            <span className="text-graphite">
              {' '}
              <InFractions
                words={`left decides ${placeWords(clearOpening.governing.left)}, right ${placeWords(clearOpening.governing.right)}`}
              />
            </span>
          </Fact>
        ) : null}
        {fill ? (
          <Fact name="slack">
            <Figure figure={fill.slack} of={`Slack, ${runFit.name}`} showsSurely />
          </Fact>
        ) : null}
        {setLine && !setLine.assumed ? (
          <Fact name="largest gap behind">
            <Figure figure={setLine.greatestGap} of={`Gap behind ${runFit.name}`} showsSurely />
            {setLine.rocks ? <span className="text-chalk"> rocks: shim the ends</span> : null}
          </Fact>
        ) : null}
        {kicks ? (
          <Fact name={tradeWord('kick', rules.region)}>
            <Figure
              figure={kicks.least}
              of={`Least ${tradeWord('kick', rules.region)}, ${runFit.name}`}
            />{' '}
            to{' '}
            <Figure
              figure={kicks.greatest}
              of={`Greatest ${tradeWord('kick', rules.region)}, ${runFit.name}`}
              showsSurely
            />
          </Fact>
        ) : null}
      </dl>
    </section>
  );
}

function Fact({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <div className="flex flex-wrap gap-x-1.5">
      <dt className="text-graphite">{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

/** "front edge, at the floor": the end is said before. */
function placeWords({ words, extrapolated }: OpeningPlace): string {
  const place = words.replace(/^(left|right) end,? ?/i, '');
  return extrapolated ? `${place} (not read there)` : place;
}
