import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { account, user } from '@/db/schema';

/** Someone who signs in with a password, in the caller's transaction; null when the address is taken. */
export async function createUser(
  tx: Transaction,
  person: { name: string; email: string; passwordHash: string },
): Promise<string | null> {
  const id = randomUUID();
  const [made] = await tx
    .insert(user)
    .values({ id, name: person.name, email: person.email, emailVerified: true })
    .onConflictDoNothing({ target: user.email })
    .returning({ id: user.id });
  if (!made) return null;
  await tx.insert(account).values({
    id: randomUUID(),
    accountId: id,
    providerId: 'credential',
    userId: id,
    password: person.passwordHash,
  });
  return id;
}

export async function findUserByEmail(tx: Transaction, email: string): Promise<string | null> {
  const [found] = await tx.select({ id: user.id }).from(user).where(eq(user.email, email));
  return found?.id ?? null;
}
