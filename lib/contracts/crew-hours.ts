/** The days and hours that each crew works, less closed days, holidays and days off, and who of it is out with others. */
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
  /** When somebody of it is out with another crew, and it cannot go. */
  elsewhere: z.array(
    z.object({
      startsAt: z.iso.datetime(),
      endsAt: z.iso.datetime(),
      crewName: z.string(),
    }),
  ),
});
export type CrewHours = z.infer<typeof crewHours>;
