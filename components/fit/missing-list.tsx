import { Verdict } from '@/components/ui/verdict';
import type { MissingReading } from '@/lib/measure/missing-reading';
import { InFractions } from './in-fractions';

/** Readings still to be taken: what a cut size hangs on first, in walking order. */
export function MissingList({ missing }: { missing: readonly MissingReading[] }) {
  const must = missing.filter(({ need }) => need === 'must');
  const should = missing.filter(({ need }) => need === 'should');
  if (missing.length === 0) {
    return (
      <p className="py-2">
        <Verdict kind="confirmed">nothing is missing</Verdict>
      </p>
    );
  }
  return (
    <div className="py-2">
      {must.length > 0 ? <Lines missing={must} /> : null}
      {should.length > 0 ? (
        <details className="mt-2">
          <summary className="text-graphite">
            {should.length === 1
              ? 'One reading more would make figures surer'
              : `${should.length} readings more would make figures surer`}
          </summary>
          <Lines missing={should} />
        </details>
      ) : null}
    </div>
  );
}

function Lines({ missing }: { missing: readonly MissingReading[] }) {
  return (
    <ul>
      {missing.map(({ slot, words, why, need, skipped }) => (
        <li key={slot} className="border-b border-rule py-1.5">
          {need === 'must' ? (
            <Verdict kind="waiting" className="mr-2">
              {skipped ? 'skipped' : 'not read'}
            </Verdict>
          ) : null}
          <InFractions words={words} />
          <span className="block text-note text-graphite">
            <InFractions words={skipped ? `Skipped: ${skipped.reason}. ${why}` : why} />
          </span>
        </li>
      ))}
    </ul>
  );
}
