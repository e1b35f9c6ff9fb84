import { todayInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { getToday } from '@/server/days/get-today';

export const GET = handle(todayInput, getToday);
