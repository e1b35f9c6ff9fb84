import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { getWaitingList } from '@/server/visits/get-waiting-list';

export const GET = handle(z.object({}), getWaitingList);
