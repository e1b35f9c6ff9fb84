import { sendTestInput } from '@/lib/contracts/messages';
import { handle } from '@/server/base/handle';
import { sendTest } from '@/server/messages/send-test';

export const POST = handle(sendTestInput, sendTest);
