import { z } from 'zod';
import { makeKeyInput } from '@/lib/contracts/programs';
import { handle } from '@/server/base/handle';
import { listPrograms } from '@/server/programs/list-programs';
import { makeKey } from '@/server/programs/make-key';

export const GET = handle(z.object({}), listPrograms);
export const POST = handle(makeKeyInput, makeKey);
