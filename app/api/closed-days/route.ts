import { changeClosedDaysInput } from '@/lib/contracts/crews';
import { handle } from '@/server/base/handle';
import { changeClosedDays } from '@/server/visits/change-closed-days';

export const PATCH = handle(changeClosedDaysInput, changeClosedDays);
