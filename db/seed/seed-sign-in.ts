import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/database';
import { account, user } from '@/db/schema';

/** Someone who signs in with the demo's password. */
export async function seedSignIn(
  tx: Transaction,
  { name, email, passwordHash }: { name: string; email: string; passwordHash: string },
): Promise<string> {
  const id = randomUUID();
  await tx.insert(user).values({ id, name, email, emailVerified: true });
  await tx.insert(account).values({
    id: randomUUID(),
    accountId: id,
    providerId: 'credential',
    userId: id,
    password: passwordHash,
  });
  return id;
}
