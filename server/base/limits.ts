import { sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { rateLimit } from '@/db/schema';
import { Refusal } from './problem-response';

/** Counts one try under a key, and refuses past the most in a window. Kept in the database, so that copies share it. */
export async function countTry(
  db: Database,
  key: string,
  limit: { most: number; windowSeconds: number },
  now: Date,
): Promise<void> {
  const windowStart = now.getTime() - limit.windowSeconds * 1000;
  const [row] = await db
    .insert(rateLimit)
    .values({ id: `try:${key}`, key: `try:${key}`, count: 1, lastRequest: now.getTime() })
    .onConflictDoUpdate({
      target: rateLimit.key,
      set: {
        count: sql`case when ${rateLimit.lastRequest} < ${windowStart} then 1 else ${rateLimit.count} + 1 end`,
        lastRequest: sql`case when ${rateLimit.lastRequest} < ${windowStart} then ${now.getTime()} else ${rateLimit.lastRequest} end`,
      },
    })
    .returning({ count: rateLimit.count });
  if (row && row.count > limit.most) {
    throw new Refusal({
      status: 429,
      code: 'too-many-tries',
      message: 'Too many tries from here. Wait a few minutes and try again.',
    });
  }
}
