import { slipInput } from '@/lib/contracts/slips';
import { handle } from '@/server/base/handle';
import { previewSlip } from '@/server/days/preview-slip';

export const POST = handle(slipInput, previewSlip);
