import { createHash } from 'node:crypto';
import { and, eq, isNull, lt, or } from 'drizzle-orm';
import { calendarFeeds, crews, people } from '@/db/schema';
import { database } from '@/server/base/database';
import { countTry } from '@/server/base/limits';
import { notFound } from '@/server/base/problem-response';
import { hashToken } from '@/server/base/secret';
import { shopContext } from '@/server/base/shop-context';
import { feedCalendar } from './feed-calendar';
import { readFeedVisits } from './read-feed-visits';

const guesses = { most: 60, windowSeconds: 900 };
const noteReadingMs = 600_000;

/** The calendar behind an address. Never made, taken back, or of somebody who left: the same answer. */
export async function readFeed(
  token: string,
  asked: { from: string; knownMark: string | null },
): Promise<Response> {
  const { db } = await database();
  const now = new Date();
  const [feed] = await db
    .select({
      id: calendarFeeds.id,
      shopId: calendarFeeds.shopId,
      crewId: calendarFeeds.crewId,
      personId: calendarFeeds.personId,
      crewName: crews.name,
      personName: people.name,
      leftAt: people.leftAt,
    })
    .from(calendarFeeds)
    .leftJoin(crews, eq(crews.id, calendarFeeds.crewId))
    .leftJoin(people, eq(people.id, calendarFeeds.personId))
    .where(
      and(
        eq(calendarFeeds.tokenHash, hashToken(token.replace(/\.ics$/, ''))),
        isNull(calendarFeeds.revokedAt),
      ),
    );
  if (!feed || feed.leftAt) {
    await countTry(db, `read-feed:${asked.from}`, guesses, now);
    throw notFound('calendar');
  }
  const ctx = await shopContext(db, {
    shopId: feed.shopId,
    actor: { kind: 'system', name: 'Calendar' },
    now,
  });
  const isLongAgo = or(
    isNull(calendarFeeds.lastReadAt),
    lt(calendarFeeds.lastReadAt, new Date(now.getTime() - noteReadingMs)),
  );
  await db
    .update(calendarFeeds)
    .set({ lastReadAt: now })
    .where(and(eq(calendarFeeds.shopId, feed.shopId), eq(calendarFeeds.id, feed.id), isLongAgo));
  const name = feed.crewName ?? feed.personName ?? '';
  const text = feedCalendar(ctx, name, await readFeedVisits(ctx, feed));
  const mark = `"${createHash('sha256').update(text).digest('base64url').slice(0, 27)}"`;
  const headers = { etag: mark, 'cache-control': 'private, no-cache' };
  // Proxies may weaken a mark; what it says of the text is the same (RFC 9110, 13.1.2).
  const known = asked.knownMark?.split(',').map((one) => one.trim().replace(/^W\//, '')) ?? [];
  if (known.includes(mark)) return new Response(null, { status: 304, headers });
  return new Response(text, {
    headers: { ...headers, 'content-type': 'text/calendar; charset=utf-8' },
  });
}
