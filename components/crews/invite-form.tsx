'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { apiPaths } from '@/lib/paths';
import { parseRole, type Role, roles, roleWords } from '@/lib/permissions';

type Invited = { link: string; emailed: boolean; email: string };

/** Invites by e-mail, and shows the link for the day when the e-mail does not arrive. */
export function InviteForm() {
  const router = useRouter();
  const [role, setRole] = useState<Role>('crew');
  const [invited, setInvited] = useState<Invited | null>(null);
  const form = useFormRequest(
    async ({ email = '', role = '' }) => {
      const answer = await askServer<{ link: string; emailed: boolean }>(apiPaths.invitations(), {
        body: { email, role },
      });
      setInvited({ ...answer, email });
    },
    () => {
      form.rest();
      router.refresh();
    },
  );
  return (
    <form onSubmit={form.submit} className="mt-6 flex max-w-form flex-col gap-3">
      <TitleBlock title="Invite somebody" level={3} />
      <TextField label="E-mail" name="email" type="email" required error={form.errorOf('email')} />
      <SelectField
        label="Role"
        name="role"
        value={role}
        onChange={(event) => setRole(parseRole(event.target.value) ?? 'crew')}
        hint={roleDoes[role]}
        options={roles.map((role) => ({ value: role, label: roleWords[role] }))}
      />
      <FormError problem={form.problem} shownFields={['email']} />
      <div>
        <Button type="submit" look="line" busyText={form.isBusy ? 'Inviting…' : undefined}>
          Invite
        </Button>
      </div>
      {invited ? (
        <p role="status">
          {invited.emailed
            ? `${invited.email} has an e-mail with the link.`
            : 'The e-mail could not be sent.'}{' '}
          You can also hand it over yourself:{' '}
          <code className="text-note break-all">{invited.link}</code>
        </p>
      ) : null}
    </form>
  );
}

/** What each may do, for whoever has to choose. */
const roleDoes: Record<Role, string> = {
  owner: 'Everything, the shop rules and the numbers too.',
  scheduler: 'Jobs, the diary and messages.',
  measurer: 'Reads the walls on a phone, lays out runs, releases sheets.',
  bench: 'Builds to the released sheets and says when they are ready.',
  crew: 'Sees its own day on a phone, reports from site, gets the signature.',
};
