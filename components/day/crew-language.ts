'use client';

import { useHolder } from '@/components/phone/phone-person';
import { useCrewLanguage } from '@/components/phone/spoken-language';
import { type CrewLanguage, type CrewWords, crewWords, inRegion } from '@/lib/words/crew';
import type { Region } from '@/lib/words/trade';

export type Crew = {
  language: CrewLanguage;
  words: CrewWords;
  region: Region;
  /** Fills in what things are called in the shop's region. */
  say: (words: string) => string;
};

/** The crew's words, for screens that have a holder. */
export function useCrew(): Crew {
  const language = useCrewLanguage();
  const { region } = useHolder();
  return {
    language,
    words: crewWords[language],
    region,
    say: (words) => inRegion(words, { region, language }),
  };
}
