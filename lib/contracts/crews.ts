/** Crews on the wire: who goes with whom and when, where the day begins, days off, and what a change leaves outside. */
import { z } from 'zod';
import { visitKind } from '@/lib/schedule/visit-kind';
import { mostWeeksOfPattern, patternProblems } from '@/lib/schedule/working-pattern';
import { latLon } from './travel';

const id = z.uuid();
const localDate = z.iso.date();
const localTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Write the time as 07:30.');
const weekday = z.number().int().min(1).max(7);

export const crewPattern = z
  .object({
    weeks: z
      .array(z.array(z.object({ weekday, start: localTime, end: localTime })).max(7))
      .min(1)
      .max(mostWeeksOfPattern),
    /** Any day of a week that the first of `weeks` describes. */
    firstWeekOf: localDate,
  })
  .superRefine((pattern, ctx) => {
    for (const { message } of patternProblems(pattern)) {
      ctx.addIssue({ code: 'custom', path: ['weeks'], message });
    }
  });

export const crewMember = z.object({
  personId: id,
  /** ISO weekdays on which they go with this crew; null: every day. */
  weekdays: z.array(weekday).min(1, 'Name a day, or leave them out.').max(7).nullable(),
});

/** Only what is given is changed. */
export const changeCrewInput = z.object({
  crewId: id,
  name: z.string().trim().min(1, 'Give the crew a name.').max(40).optional(),
  does: z.enum(['measure', 'fit']).optional(),
  colour: z.enum(['1', '2', '3', '4', '5', '6']).optional(),
  /** Empty: all kinds that what it does includes. */
  kinds: z.array(visitKind).max(6).optional(),
  /** Null: the shop's own days and hours. */
  pattern: crewPattern.nullable().optional(),
  base: z.object({ address: z.string().trim().max(200), place: latLon.nullable() }).optional(),
  members: z.array(crewMember).max(12).optional(),
  /** Nothing is kept: says what the change would leave outside. */
  isTrial: z.boolean().default(false),
});
export type ChangeCrewInput = z.infer<typeof changeCrewInput>;

export const addDaysOffInput = z
  .object({
    personId: id,
    firstDay: localDate,
    lastDay: localDate,
    reason: z.string().trim().max(80).default(''),
    isTrial: z.boolean().default(false),
  })
  .refine(({ firstDay, lastDay }) => firstDay <= lastDay, {
    path: ['lastDay'],
    message: 'The last day is before the first.',
  });
export type AddDaysOffInput = z.infer<typeof addDaysOffInput>;

export const removeDaysOffInput = z.object({ daysOffId: id });
export type RemoveDaysOffInput = z.infer<typeof removeDaysOffInput>;

export const changeClosedDaysInput = z.object({
  closedDays: z.array(localDate).max(400).optional(),
  holidays: z
    .object({
      country: z.string().regex(/^[A-Z]{2}$/, 'Two capital letters.'),
      part: z.string().max(10).default(''),
      worked: z.array(localDate).max(200).default([]),
    })
    .nullable()
    .optional(),
  isTrial: z.boolean().default(false),
});
export type ChangeClosedDaysInput = z.infer<typeof changeClosedDaysInput>;

/** A visit that stands where its crew does not work; it stays until somebody moves it. */
export const visitOutside = z.object({
  visitId: id,
  jobId: id,
  jobNumber: z.number().int(),
  customerName: z.string(),
  crewId: id,
  crewName: z.string(),
  /** "Install, Thu, Dec 10". */
  words: z.string(),
  /** Local day of the first piece that is outside, for the diary. */
  date: localDate,
  /** "Wim Sorrel is off", "the shop is closed", "ends at 16:00, the crew stops at 15:30". */
  why: z.string(),
});
export type VisitOutside = z.infer<typeof visitOutside>;

export const crewChange = z.object({
  /** Kept, or a trial. */
  isKept: z.boolean(),
  /** Outside after the change, and not before it. */
  newlyOutside: z.array(visitOutside),
});
export type CrewChange = z.infer<typeof crewChange>;

export const dayOff = z.object({
  id,
  firstDay: localDate,
  lastDay: localDate,
  /** "Thu, Dec 10 to Fri, Dec 11". */
  words: z.string(),
  /** Only for those who may change crews. */
  reason: z.string(),
});
export type DayOff = z.infer<typeof dayOff>;

export const crewSetting = z.object({
  id,
  name: z.string(),
  does: z.enum(['measure', 'fit']),
  colour: z.enum(['1', '2', '3', '4', '5', '6']),
  kinds: z.array(visitKind),
  pattern: crewPattern,
  hasOwnPattern: z.boolean(),
  base: z.object({ address: z.string(), place: latLon.nullable() }),
  members: z.array(crewMember.extend({ name: z.string() })),
});
export type CrewSetting = z.infer<typeof crewSetting>;

export const crewsView = z.object({
  crews: z.array(crewSetting),
  people: z.array(
    z.object({
      id,
      name: z.string(),
      role: z.string(),
      email: z.string().nullable(),
      daysOff: z.array(dayOff),
    }),
  ),
  closedDays: z.array(localDate),
  holidays: z
    .object({ country: z.string(), part: z.string(), worked: z.array(localDate) })
    .nullable(),
  /** Of this year and the next, where the shop keeps them. */
  publicHolidays: z.array(
    z.object({ date: localDate, name: z.string(), words: z.string(), isWorked: z.boolean() }),
  ),
  /** Whose holidays can be kept: the countries of the shop's region. */
  holidayPlaces: z.array(
    z.object({
      country: z.string(),
      name: z.string(),
      parts: z.array(z.object({ part: z.string(), name: z.string() })),
    }),
  ),
  outside: z.array(visitOutside),
  today: localDate,
});
export type CrewsView = z.infer<typeof crewsView>;
