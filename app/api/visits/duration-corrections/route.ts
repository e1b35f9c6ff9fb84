import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { getDurationCorrections } from '@/server/days/get-duration-corrections';

export const GET = handle(z.object({}), getDurationCorrections);
