import { customerAnswerInput } from '@/lib/contracts/visits';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { answerByForm } from '@/server/visits/answer-visit';

export const POST = handleOpen(customerAnswerInput, (input, request) =>
  answerByForm(input, callerAddress(request)),
);
