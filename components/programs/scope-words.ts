import type { keyScopes, ProgramEvent } from '@/lib/contracts/programs';

export const scopeWords: Record<(typeof keyScopes)[number], string> = {
  'jobs:read': 'read jobs, customers and sites',
  'jobs:change': 'start and change jobs',
  'visits:read': 'read the diary',
  'visits:book': 'book, move and call off visits',
  'walls:read': 'read rooms and readings',
  'sheets:read': 'read released sheets',
  'sheets:say-ready': 'say that cabinets are ready',
  'messages:read': 'read messages',
  'numbers:read': 'read the numbers',
};

export const eventWords: Record<ProgramEvent, string> = {
  'visit.booked': 'a visit is booked',
  'visit.confirmed': 'a customer says yes',
  'visit.moved': 'a visit moves',
  'visit.called-off': 'a visit is called off',
  'sheet.released': 'a sheet is released',
  'job.signed-off': 'a customer signs',
};

/** A scope that a newer or an older program named keeps its own name. */
export const scopeText = (scope: string): string =>
  Object.entries(scopeWords).find(([key]) => key === scope)?.[1] ?? scope;
