import { changeCrewInput } from '@/lib/contracts/crews';
import { handle } from '@/server/base/handle';
import { changeCrew } from '@/server/visits/change-crew';

export const PATCH = handle(changeCrewInput, changeCrew);
