import { and, eq, gt, isNull } from 'drizzle-orm';
import { invitations, people, shops } from '@/db/schema';
import type { JoinShopInput } from '@/lib/contracts/people';
import { roleWords } from '@/lib/permissions';
import { writeAudit } from '@/server/base/audit';
import { database } from '@/server/base/database';
import { countTry } from '@/server/base/limits';
import { log } from '@/server/base/log';
import { shopFields } from '@/server/base/person-context';
import { Refusal } from '@/server/base/problem-response';
import { hashToken } from '@/server/base/secret';
import { createUser, findUserByEmail } from './create-user';
import { hashPassword, passwordOpens } from './sign-in';

/** Accepts an invitation: makes the sign-in where there is none, and the person in the shop. */
export async function joinShop(input: JoinShopInput, from: string): Promise<{ email: string }> {
  const { db } = await database();
  const now = new Date();
  await countTry(db, `join:${from}`, { most: 20, windowSeconds: 900 }, now);
  const [invitation] = await db
    .select({
      id: invitations.id,
      email: invitations.email,
      role: invitations.role,
      shop: shopFields,
    })
    .from(invitations)
    .innerJoin(shops, eq(shops.id, invitations.shopId))
    .where(
      and(
        eq(invitations.tokenHash, hashToken(input.invitationId)),
        isNull(invitations.acceptedAt),
        gt(invitations.endsAt, now),
      ),
    );
  if (!invitation) throw invitationOver();
  const { email, role, shop } = invitation;
  const knownAlready = await db.transaction((tx) => findUserByEmail(tx, email));
  if (knownAlready && !(await passwordOpens(email, input.password))) {
    throw new Refusal({
      status: 422,
      code: 'password-not-yours',
      message: 'This e-mail signs in to Setwell already. Use the password that you have.',
      errors: { password: 'Not the password of this e-mail.' },
    });
  }
  const passwordHash = await hashPassword(input.password);

  await db.transaction(async (tx) => {
    const [taken] = await tx
      .update(invitations)
      .set({ acceptedAt: now })
      .where(
        and(
          eq(invitations.shopId, shop.id),
          eq(invitations.id, invitation.id),
          isNull(invitations.acceptedAt),
        ),
      )
      .returning({ id: invitations.id });
    if (!taken) throw invitationOver();
    const userId =
      knownAlready ?? (await createUser(tx, { name: input.personName, email, passwordHash }));
    if (!userId) throw invitationOver();
    const [person] = await tx
      .insert(people)
      .values({ shopId: shop.id, userId, name: input.personName, role })
      .onConflictDoUpdate({
        target: [people.shopId, people.userId],
        set: { role, leftAt: null },
      })
      .returning({ id: people.id });
    if (!person) throw new Error('the person was not written');
    await writeAudit(
      tx,
      { shop, actor: { kind: 'system', name: input.personName }, db, now, log },
      {
        verb: 'join-shop',
        subjectKind: 'person',
        subjectId: person.id,
        summary: `${input.personName} joined as ${roleWords[role].toLowerCase()}`,
      },
    );
  });
  return { email };
}

function invitationOver(): Refusal {
  return new Refusal({
    status: 410,
    code: 'invitation-over',
    message: 'This invitation has been used or has ended. Ask the owner for a new one.',
  });
}
