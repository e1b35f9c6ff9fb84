import { stopInput } from '@/lib/contracts/stops';
import { handle } from '@/server/base/handle';
import { getAccessCode } from '@/server/days/get-access-code';

/** Not a GET: that it was asked for is written down. */
export const POST = handle(stopInput, getAccessCode);
