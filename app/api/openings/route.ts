import { findOpeningsInput } from '@/lib/contracts/openings';
import { handle } from '@/server/base/handle';
import { findOpenings } from '@/server/visits/find-openings';

export const POST = handle(findOpeningsInput, findOpenings);
