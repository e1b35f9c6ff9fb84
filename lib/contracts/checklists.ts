/** A shop's own checklists, by the kind of visit; a kind that is left out has the usual list. */
import { z } from 'zod';
import { visitKind } from '@/lib/schedule/visit-kind';
import { plainWords } from './snags';

export const checkTimes = ['on-arrival', 'at-work', 'before-leaving'] as const;

export const checklistItem = z.object({
  /** Stable: answers hang on it. */
  key: z.string().regex(/^[a-z0-9-]{1,60}$/),
  words: z.object({ en: plainWords(200).min(1, 'Write the line.'), es: plainWords(200) }),
  /** Asked when they come, while they work, or before they go. */
  when: z.enum(checkTimes),
  /** A caution of the trade. */
  isCaution: z.boolean().optional(),
});
export type ChecklistItem = z.infer<typeof checklistItem>;

export const checklistRules = z.partialRecord(visitKind, z.array(checklistItem).max(40));
export type ChecklistRules = z.infer<typeof checklistRules>;
