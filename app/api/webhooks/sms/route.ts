import { handleSmsWebhook } from '@/server/messages/sms-webhook';
import { readInboundSms } from '@/server/ports/sms/webhooks';
import { hearSms } from '@/server/visits/hear-sms';

export const POST = handleSmsWebhook(async ({ db, params, now }) => {
  const sms = readInboundSms(params);
  if (sms) await hearSms(db, sms, now);
});
