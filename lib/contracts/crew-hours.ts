/** The days and hours that each crew works: its pattern, less closed days, holidays and days off. */
import { z } from 'zod';
import { daysBetween } from '@/lib/time/civil';

const localDate = z.iso.date();
/** More than any diary shows at once. */
const mostDays = 100;

export const listCrewHoursInput = z
  .object({
    /** [from, to) as local dates. */
    from: localDate,
    to: localDate,
  })
  .refine(({ from, to }) => from < to && daysBetween(from, to) <= mostDays, {
    path: ['to'],
    message: 'Ask for one to a hundred days.',
  });
export type ListCrewHoursInput = z.infer<typeof listCrewHoursInput>;

export const crewHours = z.object({
  crewId: z.uuid(),
  /** Only the days worked. */
  days: z.array(z.object({ date: localDate, start: z.string(), end: z.string() })),
});
export type CrewHours = z.infer<typeof crewHours>;
