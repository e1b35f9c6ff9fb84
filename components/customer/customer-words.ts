import type { CustomerVisitView } from '@/lib/contracts/visits';
import { spanishTradeWord, tradeTerms, tradeWord } from '@/lib/words/trade';
import { wordsEn } from './words-en';
import { wordsEs } from './words-es';

export type CustomerWords = typeof wordsEn;

/** Of the page that a customer opens, in their language. */
export const customerWords = (language: CustomerVisitView['language']): CustomerWords =>
  language === 'es' ? wordsEs : wordsEn;

/** Things of the trade, in braces, by the names of the shop's region. */
export function regionalWords(
  text: string,
  { language, region }: Pick<CustomerVisitView, 'language' | 'region'>,
): string {
  const wordOf = language === 'es' ? spanishTradeWord : tradeWord;
  return text.replace(/\{(\w+)\}/g, (braced, name) => {
    const term = tradeTerms.find((known) => known === name);
    return term ? wordOf(term, region) : braced;
  });
}

/** No line of the page begins with "PM" or "a.m.". In a text such a space would cost dear, so it is put here. */
export function unbroken(words: string): string {
  return words.replace(/(\d) (?=[ap]\.?m\b)/gi, '$1\u00A0');
}
