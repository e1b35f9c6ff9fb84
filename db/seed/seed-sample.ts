import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/database';
import { people, type shops } from '@/db/schema';
import { type SeedOptions, seedWorkingShop } from './seed-demo';
import { juniperBend, type StaffKey, staff } from './staff';

/** A shop to play with for somebody who has one of their own; its other people sign in nowhere. */
export async function seedSample(
  tx: Transaction,
  of: Pick<typeof shops.$inferSelect, 'id' | 'name' | 'region' | 'zone' | 'rules'> & {
    owner: { userId: string; name: string };
  },
  options: Omit<SeedOptions, 'hashPassword'>,
): Promise<void> {
  const { owner, ...shop } = of;
  const { phone, email } = juniperBend;
  await seedWorkingShop(tx, { ...shop, phone, email, isSample: true }, options, async (shopId) => {
    const ids: Partial<Record<StaffKey, string>> = {};
    for (const [key, { name, role }] of Object.entries(staff)) {
      const id = randomUUID();
      const isOwner = key === 'owner';
      await tx.insert(people).values({
        id,
        shopId,
        userId: isOwner ? owner.userId : null,
        name: isOwner ? owner.name : name,
        role,
      });
      ids[key as StaffKey] = id;
    }
    return ids as Record<StaffKey, string>;
  });
}
