import { planDayInput } from '@/lib/contracts/day-plans';
import { handle } from '@/server/base/handle';
import { planDayOrder } from '@/server/days/plan-day-order';

export const POST = handle(planDayInput, planDayOrder);
