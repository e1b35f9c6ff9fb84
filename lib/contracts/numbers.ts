/** What the shop's promises are worth: each figure with what it is of, and the jobs behind it. */
import { z } from 'zod';

export const figureKeys = [
  'second-trips',
  'short-fills',
  'days-to-measure',
  'days-to-install',
  'confirmed-before',
  'in-the-window',
  'hours',
  'drive',
  'message-cost',
] as const;
export type FigureKey = (typeof figureKeys)[number];

/** One job's part in a figure; it opens the job. */
export const figureLine = z.object({
  jobId: z.uuid(),
  jobNumber: z.number().int(),
  /** Civil date in the shop's zone. */
  on: z.string(),
  /** What it is about: kind of visit, crew, why. */
  words: z.string(),
  /** In the figure's unit; null where it counts as a yes or a no. */
  value: z.number().nullable(),
});
export type FigureLine = z.infer<typeof figureLine>;

/** A part of a figure: by why, by kind and crew, by week. */
export const figureSplit = z.object({
  name: z.string(),
  value: z.number(),
  /** What the value is of, in the same unit: visits for a share, estimated hours for hours. */
  outOf: z.number().nullable(),
});
export type FigureSplit = z.infer<typeof figureSplit>;

export const figureUnits = ['count', 'days', 'share', 'hours', 'minutes', 'money'] as const;

export const figure = z.object({
  key: z.enum(figureKeys),
  unit: z.enum(figureUnits),
  /** Null: nothing happened that it could be of. */
  value: z.number().nullable(),
  outOf: z.number(),
  splits: z.array(figureSplit),
  lines: z.array(figureLine),
  /** What a reader must know before believing it: "drive times estimated". */
  caution: z.string().nullable(),
});
export type Figure = z.infer<typeof figure>;

export const numbersInput = z.object({
  /** Days back from today. */
  days: z.coerce.number().int().min(1).max(1_100).default(90),
});
export type NumbersInput = z.infer<typeof numbersInput>;

export const numbersFileInput = numbersInput.extend({ figure: z.enum(figureKeys) });
export type NumbersFileInput = z.infer<typeof numbersFileInput>;

export const numbersView = z.object({
  from: z.string(),
  until: z.string(),
  currency: z.string(),
  figures: z.array(figure),
});
export type NumbersView = z.infer<typeof numbersView>;
