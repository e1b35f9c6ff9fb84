import { removeDaysOffInput } from '@/lib/contracts/crews';
import { handle } from '@/server/base/handle';
import { removeDaysOff } from '@/server/visits/change-days-off';

export const DELETE = handle(removeDaysOffInput, removeDaysOff);
