import type { VisitKind } from './visit-kind';

export const visitKindWords: Record<VisitKind, string> = {
  'site-measure': 'Measure',
  'check-measure': 'Check measure',
  delivery: 'Delivery',
  install: 'Install',
  'worktop-template': 'Worktop template',
  return: 'Return visit',
};

/** Which crews do which kind of visit. */
export const doesKind: Record<VisitKind, 'measure' | 'fit'> = {
  'site-measure': 'measure',
  'check-measure': 'measure',
  delivery: 'fit',
  install: 'fit',
  'worktop-template': 'measure',
  return: 'fit',
};
