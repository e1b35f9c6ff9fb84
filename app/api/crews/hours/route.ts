import { listCrewHoursInput } from '@/lib/contracts/crew-hours';
import { handle } from '@/server/base/handle';
import { listCrewHours } from '@/server/days/list-crew-hours';

export const GET = handle(listCrewHoursInput, listCrewHours);
