import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { signOffs } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';
import type { SignedCopyOf } from '@/server/visits/compose-message';
import type { LockedVisit } from '@/server/visits/lock-visit';
import { tellDone } from '@/server/visits/tell-from-site';
import { makeCopy } from './make-copy';

/** The customer is told that it is done, with a copy of what was signed. */
export async function tellSigned(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
): Promise<void> {
  await tellDone(tx, ctx, visit, true);
}

/** The copy that goes with the message, made when it goes: what was signed never changes. */
export const signedCopyOf: SignedCopyOf = async (ctx, visitId) => {
  const copy = await makeCopy(ctx, eq(signOffs.visitId, visitId));
  return copy && { filename: copy.fileName, contentType: 'application/pdf', content: copy.bytes };
};
