import { figureWords } from '@/lib/measure/explain';
import type { FitFigure } from '@/lib/measure/fit-figure';
import type { ReadingLine } from '@/lib/sheet/reading-lines';
import { FigureValue, SurelyValue } from './figure-value';
import type { Steps } from './figures';
import { InFractions } from './in-fractions';

/** How a figure came about: its formula in words, the readings that govern it, what would make it surer. */
export function FigureStory({
  figure,
  rules,
  readings,
}: {
  figure: FitFigure;
  rules: Steps;
  readings: ReadonlyMap<string, ReadingLine>;
}) {
  const words = figureWords[figure.kind];
  const behind = figure.from.flatMap((id) => readings.get(id) ?? []);
  return (
    <div className="flex flex-col gap-4">
      <p className="flex items-baseline gap-3">
        <span className="text-reading font-bold">
          <FigureValue figure={figure} rules={rules} showsUnit />
        </span>
        <span className="text-lead">
          <SurelyValue figure={figure} rules={rules} />
        </span>
      </p>
      <p className="text-note text-graphite">
        {words.name}. 95 of 100 such figures lie within the ±; it is two standard uncertainties,{' '}
        {figure.u.toFixed(2)} {words.measure === 'angle' ? '°' : 'mm'} each
        {roundingWords[words.rounding]}.
      </p>
      <section>
        <h3 className="font-bold">How it comes about</h3>
        <p>{words.formula}</p>
      </section>
      <section>
        <h3 className="font-bold">
          {behind.length === 1
            ? 'The reading it stands on'
            : `The ${behind.length} readings it stands on`}
        </h3>
        {behind.length === 0 ? (
          <p>None of its own: it follows from the shop’s rules.</p>
        ) : (
          <ul className="max-h-64 overflow-y-auto border-t border-rule">
            {behind.map((line) => (
              <li key={line.id} className="flex justify-between gap-4 border-b border-rule py-1.5">
                <span>
                  <InFractions words={line.what} />
                  <span className="block text-note text-graphite">
                    {[line.tool, line.taken].filter(Boolean).join(', ')}
                  </span>
                </span>
                <span className="text-right whitespace-nowrap">
                  <InFractions words={line.came} />
                  {line.typed ? (
                    <span className="block text-note text-graphite">
                      typed <InFractions words={line.typed} />
                    </span>
                  ) : null}
                </span>
              </li>
            ))}
          </ul>
        )}
      </section>
      <section>
        <h3 className="font-bold">What would make it surer</h3>
        <p>{words.surer}</p>
      </section>
    </div>
  );
}

const roundingWords = {
  up: '; shown rounded up',
  down: '; shown rounded down',
  nearest: '; shown to the nearest mark',
};
