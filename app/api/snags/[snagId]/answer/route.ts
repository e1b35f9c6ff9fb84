import { answerSnagInput } from '@/lib/contracts/snags';
import { handle } from '@/server/base/handle';
import { answerSnag } from '@/server/snags/answer-snag';

export const POST = handle(answerSnagInput, answerSnag);
