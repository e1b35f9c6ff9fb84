/** What a customer says is not ready yet. */
import type { Language } from '@/lib/time/text-locale';

export const missingThings = ['floor', 'power', 'parking', 'away'] as const;
export type MissingThing = (typeof missingThings)[number];

const words: Record<Language, Record<MissingThing, string>> = {
  en: {
    floor: 'the floor',
    power: 'the power',
    parking: 'room to park',
    away: 'nobody at home that day',
  },
  es: {
    floor: 'el piso',
    power: 'la electricidad',
    parking: 'lugar para estacionar',
    away: 'ese día no hay nadie en casa',
  },
};

/**
 * In one line, what was ticked and then their own words.
 * Example: floor and away with "tiles come on Friday" is "the floor; nobody at home that day; tiles come
 * on Friday" in English; nothing ticked and no words is ''.
 */
export function missingWords(
  missing: readonly MissingThing[],
  said: string,
  language: Language,
): string {
  return [...missing.map((thing) => words[language][thing]), said.trim()]
    .filter(Boolean)
    .join('; ');
}
