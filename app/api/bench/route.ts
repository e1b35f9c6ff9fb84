import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { listBench } from '@/server/sheets/list-bench';

export const GET = handle(z.object({}), listBench);
