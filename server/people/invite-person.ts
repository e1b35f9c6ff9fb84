import { invitations } from '@/db/schema';
import type { InvitePersonInput } from '@/lib/contracts/people';
import { paths } from '@/lib/paths';
import { roleWords } from '@/lib/permissions';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { env } from '@/server/base/env';
import { hashToken, newLinkToken } from '@/server/base/secret';
import { getPorts } from '@/server/ports/choose-ports';

const validDays = 7;

/** Invites by e-mail. The link is also given back, for the day when the e-mail does not arrive. */
export async function invitePerson(ctx: PersonContext, input: InvitePersonInput) {
  mustBeAllowed(ctx, 'people:invite');
  const token = newLinkToken();
  const invitationId = await ctx.db.transaction(async (tx) => {
    const [made] = await tx
      .insert(invitations)
      .values({
        shopId: ctx.shop.id,
        email: input.email,
        role: input.role,
        tokenHash: hashToken(token),
        endsAt: new Date(ctx.now.getTime() + validDays * 86_400_000),
        invitedBy: ctx.actor.personId,
      })
      .returning({ id: invitations.id });
    if (!made) throw new Error('the invitation was not written');
    await writeAudit(tx, ctx, {
      verb: 'invite-person',
      subjectKind: 'invitation',
      subjectId: made.id,
      summary: `Invited somebody as ${roleWords[input.role].toLowerCase()}`,
    });
    return made.id;
  });
  const link = `${env().publicUrl}${paths.join(token)}`;
  const sent = await (await getPorts()).email.send({
    to: input.email,
    subject: `${ctx.shop.name} invites you to Setwell`,
    text: `${ctx.actor.name} invites you to work in ${ctx.shop.name} as ${roleWords[input.role].toLowerCase()}.\n\nJoin here (the link ends after ${validDays} days): ${link}\n`,
  });
  return { invitationId, link, emailed: sent.ok };
}
