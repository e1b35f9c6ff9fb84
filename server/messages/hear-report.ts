import { and, eq, inArray, or } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';
import type { SmsReport } from '@/server/ports/sms/sms-port';
import { giveUp } from './give-up';
import { nextAskAt } from './next-ask-at';

/**
 * A delivery report, whose signature was checked. It may come late, twice, out of order, or before the
 * answer to the sending itself: only what goes forward is written.
 */
export async function hearReport(
  db: Database,
  report: SmsReport,
  heard: { messageId: string | null; now: Date },
): Promise<void> {
  const { providerId } = report;
  const { now } = heard;
  const which = or(
    eq(messages.providerId, providerId),
    heard.messageId ? eq(messages.id, heard.messageId) : undefined,
  );
  const isOpen = and(which, inArray(messages.state, ['sending', 'sent']));
  if (report.state === 'delivered') {
    await db
      .update(messages)
      .set({ state: 'delivered', providerId, deliveredAt: now, askAt: null, reason: '' })
      .where(isOpen);
  } else if (report.state === 'sent') {
    await db
      .update(messages)
      .set({ state: 'sent', providerId, sentAt: now, askAt: nextAskAt(now, now), reason: '' })
      .where(and(which, eq(messages.state, 'sending')));
  } else if (report.state === 'not-delivered') {
    const message = report.refusal?.message ?? 'No reason was given.';
    const code = report.refusal?.code ?? null;
    await giveUp(db, isOpen, { message, code, providerId }, now);
  }
}
