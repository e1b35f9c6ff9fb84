import { z } from 'zod';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { getCustomerCalendar } from '@/server/visits/get-customer-calendar';

export const GET = handleOpen(z.object({ token: z.string().max(60) }), ({ token }, request) =>
  getCustomerCalendar(token, callerAddress(request)),
);
