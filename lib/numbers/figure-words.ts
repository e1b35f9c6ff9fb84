import type { Figure, FigureKey } from '@/lib/contracts/numbers';

/** What each figure is called, what it is of (# for how many), and how it is counted. */
export const figureWords: Record<FigureKey, { name: string; of: string; how: string }> = {
  'second-trips': {
    name: 'Second trips',
    of: 'of # visits made',
    how: 'Return visits, rooms measured again, and visits where nobody was home. Why: the newest snag before the visit.',
  },
  'short-fills': {
    name: 'Short fills',
    of: 'found short on site or released short',
    how: 'Parts noted as too short on site, and sheets released although a run came out short.',
  },
  'days-to-measure': {
    name: 'Enquiry to measure',
    of: 'of # jobs first measured',
    how: 'The middle job: from the day it was asked for to the measurer’s first arrival.',
  },
  'days-to-install': {
    name: 'Enquiry to install',
    of: 'of # jobs first installed',
    how: 'The middle job: from the day it was asked for to the crew’s first arrival for the install.',
  },
  'confirmed-before': {
    name: 'Confirmed before the day',
    of: 'of # visits that came due',
    how: 'The customer had said yes before midnight of the visit’s own day, in the shop’s zone.',
  },
  'in-the-window': {
    name: 'Arrived in the window',
    of: 'of # arrivals',
    how: 'Arrived between the two times promised, both included.',
  },
  hours: {
    name: 'Hours against estimate',
    of: 'for # hours expected',
    how: 'From arriving to leaving, without pauses and without the nights between the days of one visit.',
  },
  drive: {
    name: 'Drive for a visit',
    of: 'of # visits',
    how: 'All minutes of a crew’s day, base to base in the order of its stops, shared over its visits.',
  },
  'message-cost': {
    name: 'Texts',
    of: 'for # texts sent',
    how: 'Each text is charged in messages of the carrier; long ones and those with rare letters take more.',
  },
};

/** A value as it is read out. Money is rounded to cents, hours and days to a tenth. */
export function valueWords(value: number | null, unit: Figure['unit'], currency: string): string {
  if (value === null) return 'none yet';
  switch (unit) {
    case 'share':
      return `${Math.round(value * 100)} %`;
    case 'days':
      return `${value.toFixed(1)} days`;
    case 'hours':
      return `${value.toFixed(1)} h`;
    case 'minutes':
      return `${Math.round(value)} min`;
    case 'money':
      return `${value.toFixed(2)} ${currency}`;
    case 'count':
      return String(value);
  }
}

/** One part of a figure: "6 of 8" where it is a share, "41.0 h for 36.0 h" of hours. */
export function splitWords(
  split: { value: number; outOf: number | null },
  unit: Figure['unit'],
  currency: string,
): string {
  if (unit === 'share') return `${split.value} of ${split.outOf ?? 0}`;
  if (unit === 'days') return split.value === 1 ? '1 job' : `${split.value} jobs`;
  if (unit === 'hours') {
    return `${valueWords(split.value, unit, currency)} for ${valueWords(split.outOf, unit, currency)}`;
  }
  if (unit === 'minutes') {
    return `${valueWords(split.value, unit, currency)} for ${split.outOf ?? 0} visits`;
  }
  return valueWords(split.value, unit, currency);
}
