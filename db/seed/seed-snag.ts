import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/database';
import { snags } from '@/db/schema';
import type { DemoSnag } from './demo-jobs';
import type { SeedShop } from './seed-demo';
import type { StoryLine } from './seed-story';
import { workday } from './workday';

/** What a crew found that is not right, and that it was mended where it was. */
export async function seedSnag(
  tx: Transaction,
  shop: SeedShop,
  { jobId, snag }: { jobId: string; snag: DemoSnag },
): Promise<StoryLine[]> {
  const id = randomUUID();
  const foundAt = workday(shop, snag.foundDay, '15:10');
  const closedAt = snag.closedDay === undefined ? null : workday(shop, snag.closedDay, '09:40');
  const { kind, place, words, mender } = snag;
  await tx.insert(snags).values({
    id,
    shopId: shop.id,
    jobId,
    kind,
    place,
    words,
    mender,
    dueOn: workday(shop, snag.foundDay + 10, '08:00')
      .toISOString()
      .slice(0, 10),
    foundAt,
    foundBy: shop.staff.crew,
    closedAt,
    closedBy: closedAt ? shop.staff.crew : null,
    closedWords: closedAt ? 'Mended on the return visit.' : '',
  });
  const line = (at: Date, verb: string, summary: string): StoryLine => ({
    at,
    by: 'crew',
    verb,
    subjectKind: 'snag',
    subjectId: id,
    summary,
  });
  return [
    line(foundAt, 'open-snag', `Snag, ${place}: ${words}`),
    ...(closedAt ? [line(closedAt, 'close-snag', `Snag closed, ${place}`)] : []),
  ];
}
