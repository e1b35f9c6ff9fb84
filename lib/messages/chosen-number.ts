/** The number by which a customer picks one of the visits that they were asked about. */

const numberWords: Record<string, number> = {
  one: 1,
  two: 2,
  three: 3,
  four: 4,
  uno: 1,
  una: 1,
  dos: 2,
  tres: 3,
  cuatro: 4,
  first: 1,
  second: 2,
  primera: 1,
  segunda: 2,
};
const alone = /^(?:the |la |number |no |numero )?(\d|[a-z]+)(?: please| por favor| one)?$/;

/**
 * The choice that a text makes, from 1 to `count`; null when it makes none or says more than that.
 * Example: of two, "2." and "the second one, please" are 2; "3" and "2 but later" are none.
 */
export function chosenNumber(text: string, count: number): number | null {
  const said = text
    .normalize('NFD')
    .replace(/\p{Mn}/gu, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
    .replace(/ one please$/, ' please');
  const word = alone.exec(said)?.[1];
  if (word === undefined) return null;
  const chosen = numberWords[word] ?? Number(word);
  return Number.isInteger(chosen) && chosen >= 1 && chosen <= count ? chosen : null;
}
