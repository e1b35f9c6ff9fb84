'use client';

import { TitleBlock } from '@/components/ui/title-block';
import type { Run } from '@/lib/contracts/runs';
import { settingOrder } from '@/lib/days/setting-order';
import { unitIn } from '@/lib/words/unit-names';
import { useCrew } from './crew-language';

/** What is set first, run by run. */
export function SettingOrder({ runs }: { runs: readonly Run[] }) {
  const crew = useCrew();
  const { words, say } = crew;
  return (
    <section>
      <TitleBlock title={words.order} />
      <ol className="list-decimal divide-y divide-rule border-b border-rule pl-7">
        {settingOrder(runs, (unit) => unitIn(unit, crew)).map((one) => (
          <li key={'runName' in one ? `${one.step} ${one.runName}` : one.step} className="py-2">
            {'runName' in one ? <b>{one.runName}. </b> : null}
            {say(words.steps[one.step])}
            {'runName' in one && one.startAt ? (
              <span className="block text-graphite">
                {words.startAt(one.startAt, words.startWhy[one.why])}
              </span>
            ) : null}
          </li>
        ))}
      </ol>
      <p className="pt-2 text-note text-graphite">{words.orderNote}</p>
    </section>
  );
}
