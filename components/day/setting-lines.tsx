'use client';

import { InFractions } from '@/components/fit/in-fractions';
import { TitleBlock } from '@/components/ui/title-block';
import type { SheetView } from '@/lib/contracts/rooms';
import { type SettingLine, settingLines } from '@/lib/days/setting-lines';
import { useCrew } from './crew-language';

/** levels: before anything is set. cuts: what is cut or found on the way. */
const parts = {
  levels: ['levels'],
  cuts: ['fillers', 'kicks', 'mitres', 'long', 'studs'],
} as const;

type SettingLinesProps = { sheet: SheetView; part: keyof typeof parts };

/** The figures of a sheet that a crew sets by, each as one line. */
export function SettingLines({ sheet, part }: SettingLinesProps) {
  const { words, say } = useCrew();
  const lines = settingLines(sheet, words);
  const titles: Record<SettingLine['section'], string> = {
    levels: '▼',
    fillers: words.fillersToCut,
    kicks: words.kickHeights,
    mitres: words.mitres,
    long: words.leftLong,
    studs: words.studsHere,
  };
  return parts[part].map((section) => {
    const ofSection = lines.filter((line) => line.section === section);
    if (ofSection.length === 0) return null;
    return (
      <section key={section}>
        {section === 'levels' ? null : <TitleBlock title={say(titles[section])} />}
        <ul className="divide-y divide-rule border-b border-rule">
          {ofSection.map(({ name, said, isWrong }) => (
            <li key={`${name} ${said}`} className="py-2">
              {name ? <b>{name}. </b> : null}
              <span className={isWrong ? 'text-chalk' : undefined}>
                <InFractions words={say(said)} />
              </span>
            </li>
          ))}
        </ul>
      </section>
    );
  });
}
