import { and, eq, isNull, lt, or } from 'drizzle-orm';
import { apiTokens, people, shops } from '@/db/schema';
import type { PersonContext } from './context';
import { database } from './database';
import { countTry } from './limits';
import { log } from './log';
import { shopFields } from './person-context';
import { hashToken } from './secret';

/** What every key begins with, so that one left lying in a file is found by those who look for such. */
export const keyStart = 'setwell_';
const limit = { most: 600, windowSeconds: 60 };
const seenEveryMs = 60_000;

/** The key in "Authorization: Bearer …" (RFC 6750, 2.1); null where there is none. */
export function bearerKey(headers: Headers): string | null {
  return /^Bearer (.+)$/i.exec(headers.get('authorization') ?? '')?.[1]?.trim() ?? null;
}

/** Who a key stands for: the person who made it, while they are with the shop, within what it was given. */
export async function keyContext(key: string): Promise<PersonContext | null> {
  if (!key.startsWith(keyStart)) return null;
  const { db } = await database();
  const [found] = await db
    .select({
      id: apiTokens.id,
      name: apiTokens.name,
      scopes: apiTokens.scopes,
      personId: people.id,
      userId: people.userId,
      person: people.name,
      role: people.role,
      shop: shopFields,
    })
    .from(apiTokens)
    .innerJoin(people, eq(people.id, apiTokens.madeBy))
    .innerJoin(shops, eq(shops.id, apiTokens.shopId))
    .where(
      and(
        eq(apiTokens.tokenHash, hashToken(key)),
        isNull(apiTokens.revokedAt),
        isNull(people.leftAt),
      ),
    );
  if (!found) return null;
  const now = new Date();
  await countTry(db, `key:${found.id}`, limit, now);
  await db
    .update(apiTokens)
    .set({ lastUsedAt: now })
    .where(
      and(
        eq(apiTokens.id, found.id),
        or(
          isNull(apiTokens.lastUsedAt),
          lt(apiTokens.lastUsedAt, new Date(now.getTime() - seenEveryMs)),
        ),
      ),
    );
  return {
    shop: found.shop,
    actor: {
      kind: 'person',
      personId: found.personId,
      userId: found.userId ?? '',
      name: `${found.person}, by ${found.name}`,
      role: found.role,
      scopes: new Set(found.scopes),
    },
    db,
    now,
    log,
  };
}
