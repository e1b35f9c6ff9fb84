'use client';

import { useState } from 'react';
import { signOut } from '@/components/door/auth-requests';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { paths } from '@/lib/paths';
import { phoneWords } from '@/lib/words/phone-words';
import { usePersonId } from './phone-person';
import { readUnsent } from './read-unsent';
import { useCrewLanguage } from './spoken-language';
import { useLive } from './use-live';

/** For a phone that goes to somebody else: clears what the office showed, never what was read here. */
export function SignOutPhone({ personName }: { personName: string }) {
  const personId = usePersonId();
  const language = useCrewLanguage();
  const words = phoneWords[language];
  const live = useLive('unsent', readUnsent);
  const [isLeaving, setIsLeaving] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const unsent =
    live.state === 'here' ? live.value.filter((item) => item.personId === personId).length : 0;
  const leave = async () => {
    setIsLeaving(true);
    try {
      await signOut();
      // A full load, so that nothing of this person stays in memory.
      window.location.assign(paths.signIn());
    } catch (caught) {
      setIsLeaving(false);
      setProblem(problemOf(caught).title);
    }
  };
  return (
    <section lang={language} className="flex flex-col gap-2 px-3.5 pt-2 pb-6">
      {unsent > 0 ? (
        <p className="border-l-4 border-ochre bg-tint px-3 py-2">
          {words.notWithOffice(unsent, personName)}
        </p>
      ) : null}
      {problem ? (
        <p role="alert" className="text-chalk">
          {problem}
        </p>
      ) : null}
      <Button
        look="plain"
        size="thumb"
        onClick={leave}
        busyText={isLeaving ? words.signingOut : undefined}
      >
        {words.signOut}
      </Button>
    </section>
  );
}
