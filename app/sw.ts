import { type PrecacheEntry, Serwist } from 'serwist';
import { readHolder } from '@/components/phone/kept-store';
import { sendLaterTag } from '@/components/phone/send-later';
import { alone, sendNext } from '@/components/phone/send-next';
import { pagePatienceMs } from '@/lib/sync/page-patience';
import { isPhonePage } from '@/lib/sync/phone-pages';

/**
 * The phone's worker. It keeps the program itself (the page that stands in where there is no signal, its
 * scripts, styles and fonts) and no answer of the office: what a person may see lies in the phone's own
 * store, which a sign-out clears. Only phone pages are answered; every other request goes its way.
 */
declare const self: ServiceWorkerGlobalScope & { __SW_MANIFEST?: (PrecacheEntry | string)[] };

const standIn = '/no-signal';
let failedAtMs: number | null = null;

const worker = new Serwist({
  precacheEntries: self.__SW_MANIFEST,
  precacheOptions: { cleanupOutdatedCaches: true },
  // A page says when: nothing half typed may be lost to a newer program.
  skipWaiting: false,
  clientsClaim: true,
  runtimeCaching: [
    {
      matcher: ({ request, url, sameOrigin }) =>
        sameOrigin && request.mode === 'navigate' && isPhonePage(url.pathname),
      handler: async ({ request }) => (await fromOffice(request)) ?? (await keptStandIn()),
    },
    {
      // The part of a page that a tap within the program asks for: none at all, and the tap becomes a
      // navigation, which the line above answers.
      matcher: ({ request, url, sameOrigin }) =>
        sameOrigin && isPhonePage(url.pathname) && request.headers.get('rsc') === '1',
      handler: async ({ request }) => (await fromOffice(request)) ?? Response.error(),
    },
  ],
});

worker.addEventListeners();

/** There is a signal, and perhaps no page any more: what is kept goes out all the same. */
self.addEventListener('sync', (event) => {
  const sync = event as ExtendableEvent & { tag: string };
  if (sync.tag === sendLaterTag) sync.waitUntil(alone(sendAllKept));
});

/** The office's answer, or null when it does not come in time or cannot be given. */
async function fromOffice(request: Request): Promise<Response | null> {
  const giveUp = new AbortController();
  const timer = setTimeout(() => giveUp.abort(), pagePatienceMs(failedAtMs, Date.now()));
  try {
    const response = await fetch(request, { signal: giveUp.signal });
    const isGiven = response.status < 500;
    failedAtMs = isGiven ? null : Date.now();
    return isGiven ? response : null;
  } catch {
    failedAtMs = Date.now();
    return null;
  } finally {
    clearTimeout(timer);
  }
}

async function keptStandIn(): Promise<Response> {
  return (await worker.matchPrecache(standIn)) ?? Response.error();
}

async function sendAllKept(): Promise<void> {
  const holder = await readHolder();
  if (!holder) return;
  for (;;) {
    const next = await sendNext(holder.personId);
    if (next === 'nothing' || next === 'sign-in') return;
    // The browser tries again later by itself.
    if (next === 'wait') throw new Error('the office did not answer');
  }
}
