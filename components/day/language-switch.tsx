'use client';

import { chooseLanguage, useCrewLanguage } from '@/components/phone/spoken-language';
import { type CrewLanguage, crewWords } from '@/lib/words/crew';

const languages: CrewLanguage[] = ['en', 'es'];

/** English or Spanish, each under its own name; kept on this phone. */
export function LanguageSwitch() {
  const current = useCrewLanguage();
  return (
    <fieldset className="flex gap-2 px-3.5 pt-3">
      <legend className="sr-only">Language · Idioma</legend>
      {languages.map((language) => (
        <button
          key={language}
          type="button"
          lang={language}
          aria-pressed={language === current}
          onClick={() => chooseLanguage(language)}
          className={`min-h-thumb flex-1 touch-manipulation rounded border px-3 ${
            language === current ? 'border-2 border-pine bg-tint font-bold' : 'border-graphite'
          }`}
        >
          {crewWords[language].languageName}
        </button>
      ))}
    </fieldset>
  );
}
