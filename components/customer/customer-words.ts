import type { CustomerVisitView } from '@/lib/contracts/visits';
import { wordsEn } from './words-en';
import { wordsEs } from './words-es';

export type CustomerWords = typeof wordsEn;

/** Of the page that a customer opens, in their language. */
export const customerWords = (language: CustomerVisitView['language']): CustomerWords =>
  language === 'es' ? wordsEs : wordsEn;

/** Things of the trade by the names of the shop's region. */
export function regionalWords(
  text: string,
  { language, region }: Pick<CustomerVisitView, 'language' | 'region'>,
): string {
  if (region === 'US') return text;
  return language === 'es'
    ? text.replaceAll('cubierta', 'encimera')
    : text.replaceAll('countertop', 'worktop');
}
