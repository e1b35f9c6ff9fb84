/** Papers of a job: plans and letters as PDF, kept as they came. */
import { z } from 'zod';

export const MOST_PAPER_BYTES = 20_000_000;

export const addPaperInput = z.object({
  jobId: z.uuid(),
  /** Made in the browser: sent twice, it is kept once. */
  fileId: z.uuid(),
  name: z
    .string()
    .trim()
    .min(1)
    .max(120)
    .regex(/^\P{Cc}*$/u, 'Rename the file in plain letters.'),
});
export type AddPaperInput = z.infer<typeof addPaperInput>;

export type JobFileRow = {
  id: string;
  name: string;
  caption: string;
  isPicture: boolean;
  kilobytes: number;
  addedBy: string;
  addedAtWords: string;
};
