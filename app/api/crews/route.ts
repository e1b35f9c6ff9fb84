import { z } from 'zod';
import { createCrewInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { createCrew } from '@/server/shops/create-crew';
import { listCrews } from '@/server/shops/list-crews';

export const GET = handle(z.object({}), listCrews);
export const POST = handle(createCrewInput, createCrew);
