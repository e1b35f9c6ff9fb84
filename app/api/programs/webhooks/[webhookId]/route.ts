import { webhookIdInput } from '@/lib/contracts/programs';
import { handle } from '@/server/base/handle';
import { stopWebhook } from '@/server/programs/stop-webhook';

export const DELETE = handle(webhookIdInput, stopWebhook);
