/** What a value of the wall book may be, before anybody asks what it means. */
import { z } from 'zod';

export const id = z.uuid();
/** Text that the database can keep: no NUL and no half of a surrogate pair. */
export const text = (most: number) =>
  z
    .string()
    .max(most)
    .refine((words) => !words.includes('\0') && words.isWellFormed(), 'Type it again, in letters.');
export const someText = (most: number) => text(most).min(1);
export const lengthMm = z.number().finite().min(0).max(100_000);
export const offsetMm = z.number().finite().min(-5_000).max(100_000);
export const heightMm = z.number().finite().min(-2_000).max(12_000);
