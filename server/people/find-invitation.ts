import { and, eq, gt, isNull } from 'drizzle-orm';
import { invitations, shops } from '@/db/schema';
import { database } from '@/server/base/database';
import { hashToken } from '@/server/base/secret';

/** What the join page says before anybody has signed in; null when used, ended or never made. */
export async function findInvitation(token: string) {
  const { db } = await database();
  const [found] = await db
    .select({ email: invitations.email, role: invitations.role, shopName: shops.name })
    .from(invitations)
    .innerJoin(shops, eq(shops.id, invitations.shopId))
    .where(
      and(
        eq(invitations.tokenHash, hashToken(token)),
        isNull(invitations.acceptedAt),
        gt(invitations.endsAt, new Date()),
      ),
    );
  return found ?? null;
}
