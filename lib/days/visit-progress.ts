/** How a visit goes on by taps on site: one rule for the phone, which shows it ahead, and the office, which writes it. */
import type { ReportVisitInput, VisitStatus } from '@/lib/contracts/visits';

/** Running late leaves the visit where it stands. */
export type ProgressTap = Exclude<ReportVisitInput['what'], 'running-late'>;

export const statusAfter: Record<ProgressTap, VisitStatus> = {
  'on-the-way': 'on-the-way',
  arrived: 'on-site',
  done: 'done',
  'nobody-home': 'missed',
};

/** What is told later than something that comes after it changes nothing. */
export const progressRank: Record<VisitStatus, number> = {
  held: 0,
  booked: 0,
  confirmed: 0,
  'on-the-way': 1,
  'on-site': 2,
  done: 3,
  missed: 3,
  'called-off': 4,
};
