/** The provider's JSON: a message, a page of messages, an error. */
import { countSegments } from '@/lib/messages/segments';
import type { FakeText } from './fake-sms-store';

export type FakeAnswer = { status: number; body: Record<string, unknown> };

const API_VERSION = '2010-04-01';

export function messageAnswer(accountSid: string, text: FakeText, status = 200): FakeAnswer {
  return { status, body: messageResource(accountSid, text) };
}

/** Newest first, as the provider lists them. */
export function listAnswer(
  accountSid: string,
  texts: FakeText[],
  query: URLSearchParams,
): FakeAnswer {
  const size = Math.max(1, Math.min(1000, Number(query.get('PageSize') ?? 50) || 50));
  const page = Math.max(0, Number(query.get('Page') ?? 0) || 0);
  const chosen = texts
    .filter((text) => !query.get('To') || text.to === query.get('To'))
    .filter((text) => !query.get('From') || text.from === query.get('From'))
    .reverse();
  const shown = chosen.slice(page * size, (page + 1) * size);
  const uriOf = (number: number) => {
    const params = new URLSearchParams(query);
    params.set('PageSize', String(size));
    params.set('Page', String(number));
    return `/${API_VERSION}/Accounts/${accountSid}/Messages.json?${params}`;
  };
  return {
    status: 200,
    body: {
      messages: shown.map((text) => messageResource(accountSid, text)),
      page,
      page_size: size,
      start: page * size,
      end: page * size + Math.max(0, shown.length - 1),
      uri: uriOf(page),
      first_page_uri: uriOf(0),
      previous_page_uri: page > 0 ? uriOf(page - 1) : null,
      next_page_uri: chosen.length > (page + 1) * size ? uriOf(page + 1) : null,
    },
  };
}

/** What the provider says with each code that the fake can answer with. */
const errors: Record<number, { status: number; message: string }> = {
  20003: { status: 401, message: 'Authenticate' },
  20404: { status: 404, message: 'The requested resource was not found' },
  20429: { status: 429, message: 'Too Many Requests' },
  20500: { status: 500, message: 'An internal server error has occurred' },
  21211: { status: 400, message: "The 'To' number is not a valid phone number." },
  21408: { status: 400, message: 'Permission to send an SMS has not been enabled for the region.' },
  21602: { status: 400, message: 'Message body is required.' },
  21604: { status: 400, message: "A 'To' phone number is required." },
  21606: { status: 400, message: "The 'From' number is not a valid, message-capable number." },
  21610: { status: 400, message: 'Attempt to send to unsubscribed recipient' },
  21614: { status: 400, message: "'To' number is not a valid mobile number" },
  21617: {
    status: 400,
    message: 'The concatenated message body exceeds the 1600 character limit.',
  },
};

export function errorAnswer(code: number): FakeAnswer {
  const { status, message } = errors[code] ?? { status: 400, message: 'The request was refused' };
  const more_info = `https://www.twilio.com/docs/errors/${code}`;
  return { status, body: { code, message, more_info, status } };
}

function messageResource(accountSid: string, text: FakeText): Record<string, unknown> {
  const date = new Date(text.createdAt).toUTCString().replace('GMT', '+0000');
  return {
    account_sid: accountSid,
    api_version: API_VERSION,
    body: text.body,
    date_created: date,
    date_sent: text.status === 'queued' ? null : date,
    date_updated: date,
    direction: text.direction,
    error_code: text.errorCode,
    error_message: null,
    from: text.from,
    messaging_service_sid: null,
    num_media: '0',
    num_segments: String(countSegments(text.body).segments),
    price: null,
    price_unit: 'USD',
    sid: text.sid,
    status: text.status,
    subresource_uris: {
      media: `/${API_VERSION}/Accounts/${accountSid}/Messages/${text.sid}/Media.json`,
    },
    to: text.to,
    uri: `/${API_VERSION}/Accounts/${accountSid}/Messages/${text.sid}.json`,
  };
}
