import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { listPeople } from '@/server/people/list-people';

export const GET = handle(z.object({}), listPeople);
