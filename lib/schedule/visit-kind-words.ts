import type { VisitKind } from './visit-kind';

/** For the office: short, and the same in every region. Customers read `visitInWords`. */
export const visitKindWords: Record<VisitKind, string> = {
  'site-measure': 'Measure',
  'check-measure': 'Check measure',
  delivery: 'Delivery',
  install: 'Install',
  'worktop-template': 'Template',
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
