import { acceptDayPlanInput } from '@/lib/contracts/day-plans';
import { handle } from '@/server/base/handle';
import { acceptDayPlan } from '@/server/days/accept-day-plan';

export const POST = handle(acceptDayPlanInput, acceptDayPlan);
