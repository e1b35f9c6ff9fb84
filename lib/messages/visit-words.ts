/** The kinds of visit as a customer reads them, by language and region. */
import type { VisitKind } from '@/lib/schedule/visit-kind';
import type { TextLocale } from '@/lib/time/text-locale';
import { spanishTradeWord, tradeWord } from '@/lib/words/trade';

const english: Record<VisitKind, string> = {
  'site-measure': 'site measure',
  'check-measure': 'check measure',
  delivery: 'cabinet delivery',
  install: 'cabinet install',
  'worktop-template': '{counter} template',
  return: 'return visit',
};

/** All are feminine, so that one template fits all. Recalled, not read in sources: to be checked by a native speaker. */
const spanish: Record<VisitKind, string> = {
  'site-measure': 'toma de medidas',
  'check-measure': 'comprobación de medidas',
  delivery: 'entrega de gabinetes',
  install: 'instalación de gabinetes',
  'worktop-template': 'plantilla de la {counter}',
  return: 'visita de regreso',
};

/**
 * The kind of visit in words that stand after "your" or "su".
 * Example: 'worktop-template' is "countertop template" in the US, "benchtop template" in Australia,
 * "plantilla de la cubierta" in Spanish in the US.
 */
export function visitInWords(kind: VisitKind, { language, region }: TextLocale): string {
  return language === 'es'
    ? spanish[kind].replace('{counter}', spanishTradeWord('counter', region))
    : english[kind].replace('{counter}', tradeWord('counter', region));
}
