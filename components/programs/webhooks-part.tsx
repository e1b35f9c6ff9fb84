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
import { Verdict } from '@/components/ui/verdict';
import type { AddedWebhook, WebhookView } from '@/lib/contracts/programs';
import { apiPaths } from '@/lib/paths';
import { ChooseSeveral, chosenOf } from './choose-several';
import { eventWords } from './scope-words';
import { ShownOnce } from './shown-once';

/** Where the shop's other programs are told of what happens, and whether they took it. */
export function WebhooksPart({ webhooks }: { webhooks: WebhookView[] }) {
  const router = useRouter();
  const [added, setAdded] = useState<AddedWebhook | null>(null);
  const form = useFormRequest(
    async (fields) => {
      const body = { url: fields.url ?? '', events: chosenOf('event', fields) };
      setAdded(await askServer<AddedWebhook>(apiPaths.webhooks(), { method: 'POST', body }));
    },
    () => {
      router.refresh();
      form.rest();
    },
  );
  const stop = async ({ id }: WebhookView) => {
    try {
      await askServer(apiPaths.webhook(id), { method: 'DELETE' });
      showToast({ text: 'Nothing more is told there' });
      if (added?.id === id) setAdded(null);
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title });
    }
  };
  return (
    <section>
      <TitleBlock title="Told of what happens" meta={`${webhooks.length}`} />
      {webhooks.length === 0 ? (
        <EmptyState title="No program is told">
          Give an address, and it is told within seconds when something you ticked has happened.
        </EmptyState>
      ) : (
        <ul>
          {webhooks.map((webhook) => (
            <li key={webhook.id} className="border-b border-rule py-2">
              <div className="flex flex-wrap items-baseline justify-between gap-x-6">
                <span className="break-all font-bold">{webhook.url}</span>
                <Button look="line" onClick={() => stop(webhook)}>
                  Stop<span className="sr-only"> telling {webhook.url}</span>
                </Button>
              </div>
              <p className="text-graphite">
                {webhook.events.map((event) => eventWords[event]).join(', ')}
              </p>
              <p className="flex flex-wrap gap-x-4">
                <span>
                  {webhook.taken} told, {webhook.waiting} to tell
                </span>
                {webhook.givenUp > 0 ? (
                  <Verdict kind="problem">{webhook.givenUp} given up</Verdict>
                ) : null}
                {webhook.lastAnswer ? <span>Last: {webhook.lastAnswer}</span> : null}
              </p>
            </li>
          ))}
        </ul>
      )}
      {added ? (
        <ShownOnce title="The secret of its signature" text={added.secret}>
          With it the other program knows that it was us. Keep it there; it is not shown again.
        </ShownOnce>
      ) : null}
      <form key={added?.id} onSubmit={form.submit} className="flex max-w-lg flex-col gap-3 py-4">
        <TextField
          label="Address"
          name="url"
          type="url"
          placeholder="https://"
          error={form.errorOf('url')}
        />
        <ChooseSeveral
          legend="Tell it when"
          prefix="event"
          words={eventWords}
          error={form.errorOf('events')}
        />
        <FormError problem={form.problem} shownFields={['url', 'events']} />
        <div>
          <Button type="submit" busyText={form.isBusy ? 'Adding…' : undefined}>
            Tell this address
          </Button>
        </div>
      </form>
    </section>
  );
}
