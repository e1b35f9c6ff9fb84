import { noSuchLink } from './answer-visit';
import { customerContext } from './customer-context';
import { readCustomerVisit } from './read-customer-visit';
import { visitCalendar } from './visit-calendar';
import { visitLinkAddress } from './visit-link';

/** "Add to calendar" on the customer's page. */
export async function getCustomerCalendar(token: string, from: string): Promise<Response> {
  const ctx = await customerContext(token, from);
  if (!ctx) throw noSuchLink();
  const visit = await readCustomerVisit(ctx.db, ctx, ctx.actor.visitId);
  const link = await visitLinkAddress(ctx.db, ctx, visit.id);
  const method = visit.status === 'called-off' ? 'CANCEL' : 'PUBLISH';
  return new Response(visitCalendar(ctx, visit, { method, link }), {
    headers: {
      'content-type': `text/calendar; charset=utf-8; method=${method}`,
      'content-disposition': 'attachment; filename="visit.ics"',
      'cache-control': 'no-store',
    },
  });
}
