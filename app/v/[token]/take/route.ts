import { customerTakeInput } from '@/lib/contracts/visits';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { takeByForm } from '@/server/visits/choose-time';

export const POST = handleOpen(customerTakeInput, (input, request) =>
  takeByForm(input, callerAddress(request)),
);
