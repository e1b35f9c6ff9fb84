/** What changing the shop's rules would do, and what was changed before. */
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
