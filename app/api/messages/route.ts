import { listMessagesInput } from '@/lib/contracts/messages';
import { handle } from '@/server/base/handle';
import { listMessages } from '@/server/messages/list-messages';

export const GET = handle(listMessagesInput, listMessages);
