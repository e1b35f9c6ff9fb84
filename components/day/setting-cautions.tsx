'use client';

import { TitleBlock } from '@/components/ui/title-block';
import { siteCautions } from '@/lib/cautions/site-cautions';
import type { SheetView } from '@/lib/contracts/rooms';
import { standingReadings } from '@/lib/measure/standing-readings';
import { type NamedUnit, unitIn } from '@/lib/words/unit-names';
import { useCrew } from './crew-language';

/** What to mind here, with the source beside each number. */
export function SettingCautions({ sheet }: { sheet: SheetView }) {
  const { words, say, language, region } = useCrew();
  const features = standingReadings(sheet.wallBook.readings).flatMap((one) =>
    one.kind === 'feature' ? [one.feature] : [],
  );
  const { runs, fit, isOldHouse, rules } = sheet;
  const nameOf = (unit: NamedUnit) => unitIn(unit, { language, region });
  const here = siteCautions({ runs, fit, features, isOldHouse, region: rules.region, nameOf });
  return (
    <section className="border-l-4 border-chalk pl-3">
      <TitleBlock title={words.cautions} />
      <ul className="divide-y divide-rule">
        {here.map((caution) => (
          <li key={caution.kind} className="py-2">
            {say(words.cautionWords[caution.kind](caution))}
            {caution.source ? (
              <span className="block text-note text-graphite">
                {words.sourceIs(caution.source)}
              </span>
            ) : null}
          </li>
        ))}
      </ul>
    </section>
  );
}
