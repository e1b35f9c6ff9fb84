import { jobIdInput } from '@/lib/contracts/jobs';
import { forCrewInput } from '@/lib/contracts/stops';
import { handle } from '@/server/base/handle';
import { getForCrew } from '@/server/days/get-for-crew';
import { setForCrew } from '@/server/days/set-for-crew';

export const GET = handle(jobIdInput, getForCrew);
export const PATCH = handle(forCrewInput, setForCrew);
