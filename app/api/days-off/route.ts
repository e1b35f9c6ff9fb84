import { addDaysOffInput } from '@/lib/contracts/crews';
import { handle } from '@/server/base/handle';
import { addDaysOff } from '@/server/visits/change-days-off';

export const POST = handle(addDaysOffInput, addDaysOff);
