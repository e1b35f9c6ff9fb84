/** What a customer asks on their page: in English for the office, and said back in their own language. */
import type { Language } from '@/lib/time/text-locale';
import { type MissingThing, missingThings, missingWords } from './missing-words';

/** Example: with "after six" it is "Call me: after six". */
export function callMeWords(words: string): string {
  return words ? `${callMe}${words}` : 'Call me, please';
}

/** Their own words, if there are any. */
export function otherTimeWords(words: string): string {
  return words || 'Another time, please';
}

/** Example: the floor, and "tiles come on Friday", is "the floor; tiles come on Friday". */
export function notReadyWords(missing: readonly MissingThing[], words: string): string {
  return missingWords(missing, words, 'en') || 'Not ready';
}

const callMe = 'Call me: ';

/** Our own words in Spanish; recalled, not read in sources. */
const spanish = new Map([
  ['Call me, please', 'Llámenme, por favor'],
  ['Another time, please', 'Otra fecha, por favor'],
  ['Not ready', 'Todavía no está listo'],
  ...missingThings.map(
    (thing) => [missingWords([thing], '', 'en'), missingWords([thing], '', 'es')] as const,
  ),
]);

/**
 * What the office reads, as the customer said it: what is ours in their language, their own words as they are.
 * Example: in Spanish "the floor; llega el viernes" is "el piso; llega el viernes".
 */
export function saidBack(says: string, language: Language): string {
  if (language === 'en') return says;
  if (says.startsWith(callMe)) return `Llámenme: ${says.slice(callMe.length)}`;
  return says
    .split('; ')
    .map((part) => spanish.get(part) ?? part)
    .join('; ');
}
