import { createHmac, randomUUID } from 'node:crypto';
import { and, desc, eq, gt, isNull } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/database';
import { visitLinks } from '@/db/schema';
import { paths } from '@/lib/paths';
import type { Context } from '@/server/base/context';
import { env } from '@/server/base/env';
import { hashToken, signingSecret } from '@/server/base/secret';

const daysAfterVisit = 30;
const tokenBytes = 16;

/**
 * The token is made from the link's id and the signing secret, so that it can be made again when a message
 * is written, though only its hash is stored: who reads the database alone cannot open a customer's page.
 */
function tokenOf(linkId: string): string {
  return createHmac('sha256', signingSecret())
    .update(`visit-link:${linkId}`)
    .digest()
    .subarray(0, tokenBytes)
    .toString('base64url');
}

export async function makeVisitLink(
  tx: Transaction,
  ctx: { shop: Pick<Context['shop'], 'id'> },
  visit: { visitId: string; endsAt: Date },
): Promise<void> {
  const id = randomUUID();
  await tx.insert(visitLinks).values({
    shopId: ctx.shop.id,
    id,
    visitId: visit.visitId,
    tokenHash: hashToken(tokenOf(id)),
    endsAt: linkEnd(visit.endsAt),
  });
}

/** A visit that moves keeps its link, for as long after the new time. */
export async function keepVisitLink(
  tx: Transaction,
  ctx: Context,
  visit: { visitId: string; endsAt: Date },
): Promise<void> {
  await tx
    .update(visitLinks)
    .set({ endsAt: linkEnd(visit.endsAt) })
    .where(
      and(
        eq(visitLinks.shopId, ctx.shop.id),
        eq(visitLinks.visitId, visit.visitId),
        isNull(visitLinks.revokedAt),
      ),
    );
}

/** The address of the customer's page; null when the link was revoked or has ended. */
export async function visitLinkAddress(
  db: Database,
  ctx: Context,
  visitId: string,
): Promise<string | null> {
  const [link] = await db
    .select({ id: visitLinks.id })
    .from(visitLinks)
    .where(
      and(
        eq(visitLinks.shopId, ctx.shop.id),
        eq(visitLinks.visitId, visitId),
        isNull(visitLinks.revokedAt),
        gt(visitLinks.endsAt, ctx.now),
      ),
    )
    .orderBy(desc(visitLinks.createdAt))
    .limit(1);
  return link ? `${env().publicUrl}${paths.customerVisit(tokenOf(link.id))}` : null;
}

function linkEnd(visitEndsAt: Date): Date {
  return new Date(visitEndsAt.getTime() + daysAfterVisit * 86_400_000);
}
