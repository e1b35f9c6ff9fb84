import { z } from 'zod';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { readFeed } from '@/server/days/read-feed';

export const GET = handleOpen(z.object({ token: z.string().max(80) }), ({ token }, request) =>
  readFeed(token, {
    from: callerAddress(request),
    knownMark: request.headers.get('if-none-match'),
  }),
);
