import type { z } from 'zod';
import type { customerHoldInput, customerTakeInput } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import type { CustomerContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { holdForCustomer } from './hold-for-customer';
import { openLink } from './open-link';
import { takeTimeAsCustomer } from './take-time-as-customer';

/** The customer keeps a time for a quarter of an hour, by a plain form; back to the times, which show it. */
export function holdByForm(
  { token, ...opening }: z.output<typeof customerHoldInput>,
  from: string,
): Promise<Response> {
  return byForm(token, from, {
    leadsTo: paths.customerTimes(token),
    act: (ctx) => holdForCustomer(ctx, opening),
  });
}

/** They take what is kept for them; back to their visit, which stands there now. */
export function takeByForm(
  { token, heldVisitId }: z.output<typeof customerTakeInput>,
  from: string,
): Promise<Response> {
  return byForm(token, from, {
    leadsTo: paths.customerVisit(token),
    act: (ctx) => takeTimeAsCustomer(ctx, heldVisitId),
  });
}

/** What somebody else was faster with leads back to the times; a link that opens nothing, to its page. */
async function byForm(
  token: string,
  from: string,
  { leadsTo, act }: { leadsTo: string; act: (ctx: CustomerContext) => Promise<void> },
): Promise<Response> {
  const ctx = await openLink(token, from);
  if (!ctx) return seeOther(paths.customerVisit(token));
  try {
    await act(ctx);
    return seeOther(leadsTo);
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return seeOther(`${paths.customerTimes(token)}?taken=1`);
  }
}

function seeOther(location: string): Response {
  return new Response(null, { status: 303, headers: { location } });
}
