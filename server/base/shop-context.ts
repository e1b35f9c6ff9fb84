import { eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { shops } from '@/db/schema';
import type { Actor, Context } from './context';
import { log } from './log';
import { shopFields } from './person-context';

/** A context for whoever does not sign in: a customer by a link, or the system itself. */
export async function shopContext<A extends Actor>(
  db: Database,
  of: { shopId: string; actor: A; now: Date },
): Promise<Context<A>> {
  const [shop] = await db.select(shopFields).from(shops).where(eq(shops.id, of.shopId));
  if (!shop) throw new Error(`there is no shop ${of.shopId}`);
  return { shop, actor: of.actor, db, now: of.now, log };
}
