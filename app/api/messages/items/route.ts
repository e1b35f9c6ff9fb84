import { z } from 'zod';
import { handle } from '@/server/base/handle';
import { countItems } from '@/server/messages/count-items';

export const GET = handle(z.object({}), countItems);
