/** Rows of the outbox as every screen shows them. */
import { customers, messages } from '@/db/schema';
import type { MessageView } from '@/lib/contracts/messages';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';

export const messageFields = {
  id: messages.id,
  jobId: messages.jobId,
  customerId: messages.customerId,
  customerName: customers.name,
  occasion: messages.occasion,
  channel: messages.channel,
  state: messages.state,
  reason: messages.reason,
  body: messages.body,
  segments: messages.segments,
  dueAt: messages.dueAt,
  sentAt: messages.sentAt,
  toldWith: messages.toldWith,
};
type Row = Omit<MessageView, 'dueAtWords'> & {
  dueAt: Date;
  sentAt: Date | null;
  toldWith: string | null;
};

export function messageView<R extends Row>(
  ctx: Context,
  { dueAt, sentAt, toldWith, ...row }: R,
): Omit<R, 'dueAt' | 'sentAt' | 'toldWith'> & { dueAtWords: string } {
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const at = sentAt ?? dueAt;
  const dueAtWords = `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`;
  const isTogether = toldWith !== null && row.state !== 'withdrawn';
  const together = isTogether ? 'In one message with another visit.' : '';
  return { ...row, reason: [together, row.reason].filter(Boolean).join(' '), dueAtWords };
}
