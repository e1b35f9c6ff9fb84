import { hearReport } from '@/server/messages/hear-report';
import { handleSmsWebhook } from '@/server/messages/sms-webhook';
import { readSmsReport } from '@/server/ports/sms/webhooks';

export const POST = handleSmsWebhook(async ({ db, params, messageId, now }) => {
  const report = readSmsReport(params);
  if (report) await hearReport(db, report, { messageId, now });
});
