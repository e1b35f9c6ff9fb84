import { z } from 'zod';
import type { Database } from '@/db/database';
import { database } from '@/server/base/database';
import { env } from '@/server/base/env';
import { answering, type RouteHandler } from '@/server/base/handle';
import { Refusal } from '@/server/base/problem-response';
import { getPorts } from '@/server/ports/choose-ports';

type Posted = {
  db: Database;
  params: Record<string, string>;
  /** Our own key, which the provider gives back with each report. */
  messageId: string | null;
  now: Date;
};

/** A route that the texting provider posts to: nothing is read before its signature is found good. */
export function handleSmsWebhook(hear: (posted: Posted) => Promise<void>): RouteHandler {
  return answering(async (request) => {
    const params = Object.fromEntries(new URLSearchParams(await request.text()));
    const { pathname, search, searchParams } = new URL(request.url);
    // Signed is the address that the provider was given, whatever a proxy has made of it.
    const url = `${env().publicUrl}${pathname}${search}`;
    const signature = request.headers.get('x-twilio-signature') ?? '';
    const { sms } = await getPorts();
    if (!sms.isGenuine({ url, params, signature })) throw forged();
    const { db } = await database();
    const key = z.uuid().safeParse(searchParams.get('key'));
    await hear({ db, params, messageId: key.data ?? null, now: new Date() });
    // An empty answer in the provider's language: it sends nothing back to the customer.
    return new Response('<Response/>', { headers: { 'content-type': 'text/xml' } });
  });
}

function forged(): Refusal {
  return new Refusal({
    status: 403,
    code: 'signature-not-good',
    message: 'The signature of this post is not good.',
  });
}
