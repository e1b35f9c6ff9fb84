import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { removeSample } from '@/server/keeping/remove-sample';
import { startSample } from '@/server/keeping/start-sample';

export const POST = handle(z.object({}), startSample);
export const DELETE = handle(z.object({}), removeSample);
