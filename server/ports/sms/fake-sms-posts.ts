/** What the fake provider posts to us: signed forms, as the provider sends them. */
import { randomBytes } from 'node:crypto';
import twilio from 'twilio';
import { countSegments } from '@/lib/messages/segments';
import type { FakeText } from './fake-sms-store';

const POST_TIMEOUT_MS = 10_000;
const API_VERSION = '2010-04-01';

export type FakeAccount = { accountSid: string; authToken: string; number: string };

/**
 * Posts a signed form; a connection that fails is tried once more, with the same token for telling the
 * two apart. Gives the HTTP status, or null when nobody answered.
 */
export async function postSigned(
  account: FakeAccount,
  url: string,
  params: Record<string, string>,
): Promise<number | null> {
  const headers = {
    'content-type': 'application/x-www-form-urlencoded',
    'x-twilio-signature': twilio.getExpectedTwilioSignature(account.authToken, url, params),
    'i-twilio-idempotency-token': randomBytes(16).toString('hex'),
  };
  const body = new URLSearchParams(params).toString();
  for (let tries = 0; tries < 2; tries++) {
    try {
      const signal = AbortSignal.timeout(POST_TIMEOUT_MS);
      const answer = await fetch(url, {
        method: 'POST',
        headers,
        body,
        signal,
        redirect: 'manual',
      });
      await answer.arrayBuffer();
      return answer.status;
    } catch {
      // Nobody there: once more, then given up, as the provider does.
    }
  }
  return null;
}

/** A report on a text of ours. */
export function statusParams(
  account: FakeAccount,
  text: FakeText,
  status: string,
  errorCode: number | null,
): Record<string, string> {
  return {
    AccountSid: account.accountSid,
    ApiVersion: API_VERSION,
    From: text.from,
    To: text.to,
    MessageSid: text.sid,
    SmsSid: text.sid,
    MessageStatus: status,
    SmsStatus: status,
    ...(errorCode === null ? {} : { ErrorCode: String(errorCode) }),
  };
}

/** A text from a customer. */
export function inboundParams(
  account: FakeAccount,
  text: FakeText,
  optOutType: 'STOP' | 'START' | null,
): Record<string, string> {
  return {
    AccountSid: account.accountSid,
    ApiVersion: API_VERSION,
    From: text.from,
    To: text.to,
    Body: text.body,
    MessageSid: text.sid,
    SmsMessageSid: text.sid,
    SmsSid: text.sid,
    SmsStatus: 'received',
    NumMedia: '0',
    NumSegments: String(countSegments(text.body).segments),
    ...(optOutType ? { OptOutType: optOutType } : {}),
  };
}
