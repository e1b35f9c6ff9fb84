import type { ReportVisitInput, VisitStatus } from '@/lib/contracts/visits';

export type VisitTap = ReportVisitInput['what'];

/** What can be tapped next, the likeliest first. */
export function tapsFrom(status: VisitStatus): VisitTap[] {
  switch (status) {
    case 'held':
    case 'booked':
    case 'confirmed':
      return ['on-the-way', 'arrived', 'running-late'];
    case 'on-the-way':
      return ['arrived', 'running-late', 'nobody-home'];
    case 'on-site':
      return ['done', 'nobody-home'];
    case 'done':
    case 'missed':
    case 'called-off':
      return [];
  }
}
