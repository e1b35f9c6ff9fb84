/** The kinds of visit as a customer reads them, by language and region. */
import type { VisitKind } from '@/lib/schedule/visit-kind';
import type { TextLocale } from '@/lib/time/text-locale';

const english: Record<VisitKind, string> = {
  'site-measure': 'site measure',
  'check-measure': 'check measure',
  delivery: 'cabinet delivery',
  install: 'cabinet install',
  'worktop-template': 'worktop template',
  return: 'return visit',
};

/** All are feminine, so that one template fits all. Recalled, not read in sources: to be checked by a native speaker. */
const spanish: Record<VisitKind, string> = {
  'site-measure': 'toma de medidas',
  'check-measure': 'comprobación de medidas',
  delivery: 'entrega de gabinetes',
  install: 'instalación de gabinetes',
  'worktop-template': 'plantilla de la encimera',
  return: 'visita de regreso',
};

/**
 * The kind of visit in words that stand after "your" or "su".
 * Example: 'worktop-template' is "countertop template" in the US, "worktop template" elsewhere,
 * "plantilla de la cubierta" in Spanish in the US.
 */
export function visitInWords(kind: VisitKind, { language, region }: TextLocale): string {
  if (language === 'es') {
    return region === 'US' ? spanish[kind].replace('encimera', 'cubierta') : spanish[kind];
  }
  return region === 'US' ? english[kind].replace('worktop', 'countertop') : english[kind];
}
