import { customerHoldInput } from '@/lib/contracts/visits';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { holdByForm } from '@/server/visits/choose-time';

export const POST = handleOpen(customerHoldInput, (input, request) =>
  holdByForm(input, callerAddress(request)),
);
