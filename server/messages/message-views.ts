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
};
type Row = Omit<MessageView, 'dueAtWords'> & { dueAt: Date; sentAt: Date | null };

export function messageView<R extends Row>(
  ctx: Context,
  { dueAt, sentAt, ...row }: R,
): Omit<R, 'dueAt' | 'sentAt'> & { dueAtWords: string } {
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const at = sentAt ?? dueAt;
  const dueAtWords = `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`;
  return { ...row, dueAtWords };
}
