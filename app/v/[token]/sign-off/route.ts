import { z } from 'zod';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { getCustomerCopy } from '@/server/snags/get-customer-copy';

export const GET = handleOpen(z.object({ token: z.string().max(60) }), ({ token }, request) =>
  getCustomerCopy(token, callerAddress(request)),
);
