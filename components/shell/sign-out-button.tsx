'use client';

import { useState } from 'react';
import { signOut } from '@/components/door/auth-requests';
import { Button } from '@/components/ui/button';
import { showToast } from '@/components/ui/toast-store';
import { paths } from '@/lib/paths';
import { problemOf } from './ask-server';

export function SignOutButton() {
  const [isLeaving, setIsLeaving] = useState(false);
  const leave = async () => {
    setIsLeaving(true);
    try {
      await signOut();
      // A full load, so that nothing of this person stays in memory.
      window.location.assign(paths.signIn());
    } catch (caught) {
      setIsLeaving(false);
      showToast({ text: problemOf(caught).title, isProblem: true });
    }
  };
  return (
    <Button
      look="plain"
      className="-ml-3.5 self-start text-note!"
      onClick={leave}
      busyText={isLeaving ? 'Signing out…' : undefined}
    >
      Sign out
    </Button>
  );
}
