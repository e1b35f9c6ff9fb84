import { stopInput } from '@/lib/contracts/stops';
import { handle } from '@/server/base/handle';
import { getStop } from '@/server/days/get-stop';

export const GET = handle(stopInput, getStop);
