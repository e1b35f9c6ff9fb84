import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { shops } from '@/db/schema';
import type { DemoSignature } from '@/db/seed/seed-sign-off';
import type { PersonContext } from '@/server/base/context';
import { log } from '@/server/base/log';
import { writeSignOff } from './write-sign-off';

/** For the seed of the demo: a signature of days ago, kept as a phone's would be kept, under the same seal. */
export async function keepDemoSignOff(
  tx: Transaction,
  { shopId, takenBy, signedAt, ...signed }: DemoSignature,
): Promise<void> {
  const [shop] = await tx.select().from(shops).where(eq(shops.id, shopId));
  if (!shop) throw new Error('the demo has no shop');
  const ctx: PersonContext = {
    shop,
    actor: { kind: 'person', role: 'crew', userId: '', ...takenBy },
    db: tx,
    now: signedAt,
    log,
  };
  const at = signedAt.toISOString();
  await writeSignOff(tx, ctx, { what: 'sign-off', id: randomUUID(), at, ...signed }, signedAt);
}
