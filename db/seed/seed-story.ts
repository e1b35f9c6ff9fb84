import type { Transaction } from '@/db/database';
import { audit } from '@/db/schema';
import { type StaffKey, staff } from './staff';

/** One line of a job's story, by a person of the shop or by its customer. */
export type StoryLine = {
  at: Date;
  by: StaffKey | { customer: string };
  verb: string;
  subjectKind: 'job' | 'visit' | 'room' | 'release' | 'snag';
  subjectId: string;
  summary: string;
};

/** In order of time, up to now: what is still to come has not happened. */
export async function seedStory(
  tx: Transaction,
  { shopId, jobId, now }: { shopId: string; jobId: string; now: Date },
  lines: StoryLine[],
) {
  const past = lines.filter(({ at }) => at <= now);
  if (past.length === 0) return;
  await tx
    .insert(audit)
    .values(
      past
        .toSorted((one, other) => one.at.getTime() - other.at.getTime())
        .map(({ by, ...line }) => ({ shopId, jobId, ...actor(by), ...line })),
    );
}

function actor(by: StoryLine['by']) {
  return typeof by === 'string'
    ? ({ actorKind: 'person', actorName: staff[by].name } as const)
    : ({ actorKind: 'customer', actorName: by.customer } as const);
}
