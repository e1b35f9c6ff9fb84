/** What the provider posts to us, read once its signature was checked (`SmsPort.isGenuine`). */
import { refusalOf } from './provider-codes';
import type { SmsReport, SmsState } from './sms-port';

export type InboundSms = { providerId: string; from: string; to: string; body: string };

type Params = Record<string, string | undefined>;

const states: Record<string, SmsState> = {
  accepted: 'waiting',
  scheduled: 'waiting',
  queued: 'waiting',
  sending: 'waiting',
  sent: 'sent',
  delivered: 'delivered',
  read: 'delivered',
  undelivered: 'not-delivered',
  failed: 'not-delivered',
  canceled: 'not-delivered',
};

/** A text from a customer; null when the post is something else. */
export function readInboundSms(params: Params): InboundSms | null {
  const { MessageSid: providerId, From: from, To: to, Body: body } = params;
  if (!providerId || !from || !to || body === undefined) return null;
  return { providerId, from, to, body };
}

/** A report on a text of ours; null when the post is something else. */
export function readSmsReport(params: Params): SmsReport | null {
  const { MessageSid: providerId, MessageStatus: status, ErrorCode: errorCode } = params;
  if (!providerId || !status) return null;
  return reportOf(providerId, status, errorCode ? Number(errorCode) : null);
}

/** The provider's word for where a message stands, in ours; null for a word that says nothing about it. */
export function reportOf(
  providerId: string,
  status: string,
  errorCode: number | null,
): SmsReport | null {
  const state = states[status];
  if (!state) return null;
  const isFinal = state === 'delivered' || state === 'not-delivered';
  const refusal = state === 'not-delivered' ? refusalOf(errorCode) : null;
  return { providerId, state, isFinal, refusal };
}
