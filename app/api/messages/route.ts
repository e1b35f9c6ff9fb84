import { listMessagesInput, writeByHandInput } from '@/lib/contracts/messages';
import { handle } from '@/server/base/handle';
import { listMessages } from '@/server/messages/list-messages';
import { writeByHand } from '@/server/messages/write-by-hand';

export const GET = handle(listMessagesInput, listMessages);
export const POST = handle(writeByHandInput, writeByHand);
