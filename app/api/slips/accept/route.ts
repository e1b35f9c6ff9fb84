import { acceptSlipInput } from '@/lib/contracts/slips';
import { handle } from '@/server/base/handle';
import { acceptSlip } from '@/server/days/accept-slip';

export const POST = handle(acceptSlipInput, acceptSlip);
