import type { Metadata } from 'next';
import { connection } from 'next/server';
import { JoinForm } from '@/components/door/join-form';
import { PlainPage } from '@/components/shell/plain-page';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';
import { roleWords } from '@/lib/permissions';
import { findInvitation } from '@/server/people/find-invitation';

export const metadata: Metadata = { title: 'Join a shop', referrer: 'no-referrer' };

type JoinPageProps = { params: Promise<{ invitationId: string }> };

export default async function JoinPage({ params }: JoinPageProps) {
  const { invitationId } = await params;
  await connection();
  const invitation = await findInvitation(invitationId);
  if (!invitation) return <InvitationOver />;
  const role = roleWords[invitation.role].toLowerCase();
  return (
    <PlainPage width="form">
      <TitleBlock level={1} title={`Join ${invitation.shopName}`} meta={role} className="mb-6" />
      <JoinForm invitationId={invitationId} email={invitation.email} />
    </PlainPage>
  );
}

function InvitationOver() {
  return (
    <PlainPage width="form">
      <TitleBlock level={1} title="This invitation is over" />
      <p className="py-4">
        It has been used, or its days have run out. Ask the shop's owner for a new one; if you
        joined already, sign in.
      </p>
      <LinkButton href={paths.signIn()}>Sign in</LinkButton>
    </PlainPage>
  );
}
