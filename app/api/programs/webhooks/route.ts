import { addWebhookInput } from '@/lib/contracts/programs';
import { handle } from '@/server/base/handle';
import { addWebhook } from '@/server/programs/add-webhook';

export const POST = handle(addWebhookInput, addWebhook);
