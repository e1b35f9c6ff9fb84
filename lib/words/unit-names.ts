import type { UnitKind } from '@/lib/contracts/runs';
import { unitWords } from '@/lib/sheet/unit-words';
import type { CrewLanguage } from './crew';
import { type Region, spanishTradeWord } from './trade';

export type NamedUnit = { name: string; kind: UnitKind };

/** The unit's own name, else its kind, as the crew speaks: "Refrigerator", "Refrigerador". */
export function unitIn(
  unit: NamedUnit,
  { language, region }: { language: CrewLanguage; region: Region },
): string {
  if (language === 'en') return unitWords(unit, region);
  return unit.name || upper(spanishKind(unit.kind, region));
}

/** A kind of unit in Spanish, in the middle of a sentence; recalled but for the words of the glossary. */
export function spanishKind(kind: UnitKind, region: Region): string {
  switch (kind) {
    case 'base':
      return spanishTradeWord('baseUnit', region);
    case 'wall':
      return spanishTradeWord('wallUnit', region);
    case 'tall':
      return spanishTradeWord('tallUnit', region);
    case 'dishwasher':
    case 'range':
    case 'refrigerator':
    case 'hood':
      return spanishTradeWord(kind, region);
    case 'drawers':
      return 'cajonera';
    case 'sink':
      return 'fregadero';
    case 'corner':
      return 'esquinero';
    case 'panel':
      return 'panel lateral';
    case 'open':
      return 'hueco';
  }
}

const upper = (word: string) => word.charAt(0).toUpperCase() + word.slice(1);
