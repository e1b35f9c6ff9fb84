'use client';

import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { paths } from '@/lib/paths';
import { signIn } from './auth-requests';
import { DemoPeople, type DemoPerson } from './demo-people';
import { useFormRequest } from './use-form-request';

type SignInFormProps = {
  /** Where the person was going. */
  next?: string;
  /** In the demo: everybody who can be signed in as, with one tap. */
  demoPeople?: DemoPerson[];
};

export function SignInForm({ next, demoPeople = [] }: SignInFormProps) {
  // The door itself, once more and as somebody: it knows where each role's day begins.
  const goOn = () => window.location.assign(paths.signIn(next));
  const form = useFormRequest(
    ({ email = '', password = '' }) => signIn({ email: email.trim(), password }),
    goOn,
  );
  return (
    <div className="flex flex-col gap-8">
      {demoPeople.length > 0 ? (
        <DemoPeople people={demoPeople} isBusy={form.isBusy} onChoose={form.run} />
      ) : null}
      <form onSubmit={form.submit} className="flex flex-col gap-4">
        <TextField label="E-mail" name="email" type="email" autoComplete="username" required />
        <TextField
          label="Password"
          name="password"
          type="password"
          autoComplete="current-password"
          required
        />
        <FormError problem={form.problem} />
        <Button type="submit" size="thumb" busyText={form.isBusy ? 'Signing in…' : undefined}>
          Sign in
        </Button>
      </form>
    </div>
  );
}
