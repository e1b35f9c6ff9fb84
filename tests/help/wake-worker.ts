import type { BrowserContext } from 'playwright-core';
import { sendLaterTag } from '@/components/phone/send-later';

type Updated = { registrations: { registrationId: string; scopeURL: string }[] };

/** Does what the browser does when there is a signal again: wakes the worker to send, with no page of it open. */
export async function wakeWorker(context: BrowserContext, origin: string): Promise<void> {
  const [page] = context.pages();
  if (!page) throw new Error('no page is open');
  const session = await context.newCDPSession(page);
  const registrationId = new Promise<string>((resolve) => {
    session.on('ServiceWorker.workerRegistrationUpdated', ({ registrations }: Updated) => {
      const own = registrations.find(({ scopeURL }) => scopeURL.startsWith(origin));
      if (own) resolve(own.registrationId);
    });
  });
  await session.send('ServiceWorker.enable');
  await session.send('ServiceWorker.dispatchSyncEvent', {
    origin: `${origin}/`,
    registrationId: await registrationId,
    tag: sendLaterTag,
    lastChance: false,
  });
  await session.detach();
}
