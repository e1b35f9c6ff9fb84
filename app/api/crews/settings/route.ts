import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { getCrews } from '@/server/visits/get-crews';

export const GET = handle(z.object({}), getCrews);
