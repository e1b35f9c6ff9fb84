'use client';

import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { paths } from '@/lib/paths';
import { joinShop } from './auth-requests';
import { useFormRequest } from './use-form-request';

/** Accepts an invitation. Somebody who signs in already gives the password that they have. */
export function JoinForm({ invitationId, email }: { invitationId: string; email: string }) {
  const form = useFormRequest(
    ({ personName = '', password = '' }) => joinShop({ invitationId, personName, password }),
    () => window.location.assign(paths.signIn()),
  );
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-4">
      <TextField label="E-mail" name="email" value={email} autoComplete="username" readOnly />
      <TextField
        label="Your name"
        name="personName"
        autoComplete="name"
        hint="As the crew and the customers know you."
        required
        maxLength={80}
        error={form.errorOf('personName')}
      />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="new-password"
        hint="At least 10 characters. If this e-mail signs in to Setwell already: the password you have."
        minLength={10}
        required
        error={form.errorOf('password')}
      />
      <FormError problem={form.problem} shownFields={['personName', 'password']} />
      <Button type="submit" size="thumb" busyText={form.isBusy ? 'Joining…' : undefined}>
        Join
      </Button>
    </form>
  );
}
