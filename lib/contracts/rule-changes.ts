/** What changing the shop's rules would do, and what was changed before. */
import { z } from 'zod';
import type { RuleChange } from '@/lib/rules/rule-changes';

export type RulePreview = {
  changes: RuleChange[];
  /** Rooms not released yet, in which verdicts or fills come out otherwise. */
  rooms: { jobId: string; roomId: string; words: string; from: string; to: string }[];
  roomsLookedAt: number;
  /** They stay as they are. */
  releasedSheets: number;
};

export type RuleHistoryLine = { id: string; who: string; atWords: string; changes: RuleChange[] };

/** One line of that history, to be taken back. */
export const ruleChangeInput = z.object({ changeId: z.uuid() });
export type RuleChangeInput = z.infer<typeof ruleChangeInput>;
