/** Texting through the provider's own SDK, against the provider or anything that speaks its API. */
import twilio from 'twilio';
import type RequestClient from 'twilio/lib/base/RequestClient';
import { refusalOf } from './provider-codes';
import type { OutgoingSms, SmsLookup, SmsPort, SmsRefusal, SmsReport } from './sms-port';
import { reportOf } from './webhooks';

export type TwilioSettings = {
  accountSid: string;
  authToken: string;
  /** E.164, or a sender name. */
  from: string;
  /** Where the API is, when it is not the provider's own: a fake on loopback. */
  apiBaseUrl?: string;
  timeoutMs?: number;
};

const USUAL_TIMEOUT_MS = 10_000;
/** More texts to one number since a crash than any worker could have sent. */
const MOST_TO_LOOK_THROUGH = 50;

export function twilioSms(settings: TwilioSettings): SmsPort {
  const { accountSid, authToken, from } = settings;
  const client = twilio(accountSid, authToken, { httpClient: httpClientFor(settings) });

  return {
    async send(sms) {
      try {
        const { to, body } = sms;
        const message = await client.messages.create({ to, from, body, ...callbackOf(sms) });
        const report = reportOf(message.sid, message.status, message.errorCode);
        return { ok: true, providerId: message.sid, state: report?.state ?? 'waiting' };
      } catch (error) {
        return { ok: false, refusal: refusalFrom(error) };
      }
    },

    find(providerId) {
      return look(async () => {
        const message = await client.messages(providerId).fetch();
        return reportOf(message.sid, message.status, message.errorCode);
      });
    },

    findSent({ to, body, since, except }) {
      return look(async () => {
        const newest = await client.messages.list({ to, from, limit: MOST_TO_LOOK_THROUGH });
        const same = newest.find(
          (message) =>
            message.body === body &&
            message.dateCreated >= startOfSecond(since) &&
            !except?.has(message.sid),
        );
        return same ? reportOf(same.sid, same.status, same.errorCode) : null;
      });
    },

    isGenuine({ url, params, signature }) {
      return twilio.validateRequest(authToken, signature, url, params);
    },
  };
}

/** Sends the SDK's requests to another host, path and query unchanged. */
class RedirectedRequestClient extends twilio.RequestClient {
  constructor(
    private readonly baseUrl: string,
    timeout: number,
  ) {
    super({ timeout, keepAlive: false });
  }

  override request<TData>(options: RequestClient.RequestOptions<TData>) {
    const { pathname, search } = new URL(options.uri);
    return super.request<TData>({ ...options, uri: `${this.baseUrl}${pathname}${search}` });
  }
}

function httpClientFor({ apiBaseUrl, timeoutMs = USUAL_TIMEOUT_MS }: TwilioSettings) {
  return apiBaseUrl
    ? new RedirectedRequestClient(apiBaseUrl.replace(/\/$/, ''), timeoutMs)
    : new twilio.RequestClient({ timeout: timeoutMs });
}

function callbackOf({ statusCallback, idempotencyKey }: OutgoingSms): { statusCallback?: string } {
  if (!statusCallback) return {};
  if (!idempotencyKey) return { statusCallback };
  const url = new URL(statusCallback);
  url.searchParams.set('key', idempotencyKey);
  return { statusCallback: url.href };
}

/** The provider's times have no fraction of a second. */
function startOfSecond(instant: Date): Date {
  return new Date(Math.floor(instant.getTime() / 1000) * 1000);
}

async function look(ask: () => Promise<SmsReport | null>): Promise<SmsLookup<SmsReport>> {
  try {
    return { ok: true, found: await ask() };
  } catch (error) {
    const refusal = refusalFrom(error);
    return refusal.providerCode === 20404 ? { ok: true, found: null } : { ok: false, refusal };
  }
}

/** Faults that happen before a request has left this machine, so that nothing can have been sent. */
const neverLeft = new Set([
  'ECONNREFUSED',
  'ENOTFOUND',
  'EAI_AGAIN',
  'EHOSTUNREACH',
  'ENETUNREACH',
]);

function refusalFrom(error: unknown): SmsRefusal {
  if (!(error instanceof Error)) throw error;
  const { code, status, message: detail } = error as Error & { code?: unknown; status?: unknown };
  if (typeof status === 'number') {
    return refusalOf(typeof code === 'number' ? code : null, status, detail);
  }
  if (typeof code === 'string' && neverLeft.has(code)) {
    const message = 'The texting service cannot be reached.';
    return { code: 'unreachable', retry: 'later', providerCode: null, message, detail };
  }
  if (typeof code !== 'string') throw error;
  const message = 'The texting service did not answer; the text may have been sent.';
  return { code: 'no-answer', retry: 'ask-first', providerCode: null, message, detail };
}
