import { and, eq, inArray, or } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';
import type { SmsReport } from '@/server/ports/sms/sms-port';
import { callThem, writeOptOut } from './write-outcome';

/**
 * A delivery report, whose signature was checked. It may come late, twice, out of order, or before the
 * answer to the sending itself: only what goes forward is written.
 */
export async function hearReport(
  db: Database,
  report: SmsReport,
  heard: { messageId: string | null; now: Date },
): Promise<void> {
  const which = or(
    eq(messages.providerId, report.providerId),
    heard.messageId ? eq(messages.id, heard.messageId) : undefined,
  );
  const isOpen = inArray(messages.state, ['sending', 'sent']);
  const { providerId } = report;
  if (report.state === 'delivered') {
    await db
      .update(messages)
      .set({ state: 'delivered', providerId, deliveredAt: heard.now, reason: '' })
      .where(and(which, isOpen));
  } else if (report.state === 'sent') {
    await db
      .update(messages)
      .set({ state: 'sent', providerId, sentAt: heard.now, reason: '' })
      .where(and(which, eq(messages.state, 'sending')));
  } else if (report.state === 'not-delivered') {
    const why = report.refusal?.message ?? 'No reason was given.';
    const refused = await db
      .update(messages)
      .set({ state: 'refused', providerId, reason: callThem(why) })
      .where(and(which, isOpen))
      .returning({ shopId: messages.shopId, customerId: messages.customerId });
    if (report.refusal?.code !== 'opted-out') return;
    for (const message of refused) await writeOptOut(db, message, heard.now);
  }
}
