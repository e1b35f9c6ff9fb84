'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { SelectField } from '@/components/ui/select-field';
import { showToast } from '@/components/ui/toast-store';
import type { ThreadView } from '@/lib/contracts/messages';
import { setLanguage } from './messages-query';

/** Kept as soon as it is chosen; what waits to be told is told in it, too. */
export function LanguageChoice({
  customerId,
  name,
  language,
}: Pick<ThreadView, 'customerId' | 'name' | 'language'>) {
  const router = useRouter();
  const [chosen, setChosen] = useState(language);
  async function choose(value: string) {
    const next = value === 'es' ? 'es' : 'en';
    setChosen(next);
    try {
      await setLanguage({ customerId, language: next });
      showToast({ text: `${name} is told in ${next === 'es' ? 'Spanish' : 'English'}` });
      router.refresh();
    } catch (caught) {
      setChosen(language);
      showToast({ text: problemOf(caught).title, isProblem: true });
    }
  }
  return (
    <SelectField
      label="Told in"
      value={chosen}
      onChange={(event) => choose(event.target.value)}
      options={[
        { value: 'en', label: 'English' },
        { value: 'es', label: 'Spanish' },
      ]}
    />
  );
}
