'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import type { KeyView, MadeKey } from '@/lib/contracts/programs';
import { apiPaths } from '@/lib/paths';
import { ChooseSeveral, chosenOf } from './choose-several';
import { scopeText, scopeWords } from './scope-words';
import { ShownOnce } from './shown-once';

/** Keys by which other programs ask; made, shown once, taken back. */
export function KeysPart({ keys }: { keys: KeyView[] }) {
  const router = useRouter();
  const [made, setMade] = useState<MadeKey | null>(null);
  const form = useFormRequest(
    async (fields) => {
      const body = { name: fields.name ?? '', scopes: chosenOf('scope', fields) };
      setMade(await askServer<MadeKey>(apiPaths.programKeys(), { method: 'POST', body }));
    },
    () => {
      router.refresh();
      form.rest();
    },
  );
  const takeBack = async ({ id, name }: KeyView) => {
    try {
      await askServer(apiPaths.programKey(id), { method: 'DELETE' });
      showToast({ text: `The key of ${name} opens nothing any more` });
      if (made?.id === id) setMade(null);
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title });
    }
  };
  return (
    <section>
      <TitleBlock title="Keys" meta={`${keys.length}`} />
      {keys.length === 0 ? (
        <EmptyState title="No program has a key">
          A key lets another program of yours read or book, and no more than you tick.
        </EmptyState>
      ) : (
        <ul>
          {keys.map((key) => (
            <li
              key={key.id}
              className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 border-b border-rule py-2"
            >
              <span className="font-bold">{key.name}</span>
              <span className="text-graphite">
                may {key.scopes.map(scopeText).join(', ')} · by {key.madeByName}, {key.madeAtWords}{' '}
                · {key.lastUsedWords ? `last used ${key.lastUsedWords}` : 'not used yet'}
              </span>
              <Button look="line" onClick={() => takeBack(key)}>
                Take back<span className="sr-only"> the key of {key.name}</span>
              </Button>
            </li>
          ))}
        </ul>
      )}
      {made ? (
        <ShownOnce title="The key, shown this once" text={made.key}>
          Put it into the other program now, behind “Authorization: Bearer”.
        </ShownOnce>
      ) : null}
      {made ? (
        <p className="py-2">
          Try it from a shell:{' '}
          <code className="block break-all font-mono text-note">
            curl -H "Authorization: Bearer {made.key}" {window.location.origin}
            {apiPaths.jobs()}
          </code>
        </p>
      ) : null}
      <form key={made?.id} onSubmit={form.submit} className="flex max-w-lg flex-col gap-3 py-4">
        <TextField
          label="For which program"
          name="name"
          autoComplete="off"
          error={form.errorOf('name')}
        />
        <ChooseSeveral
          legend="It may"
          prefix="scope"
          words={scopeWords}
          error={form.errorOf('scopes')}
        />
        <FormError problem={form.problem} shownFields={['name', 'scopes']} />
        <div>
          <Button type="submit" busyText={form.isBusy ? 'Making…' : undefined}>
            Make a key
          </Button>
        </div>
      </form>
    </section>
  );
}
