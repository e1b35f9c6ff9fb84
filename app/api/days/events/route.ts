import { dayEventsInput } from '@/lib/contracts/day-events';
import { handle } from '@/server/base/handle';
import { recordDayEvents } from '@/server/days/record-day-events';

export const POST = handle(dayEventsInput, recordDayEvents);
