import type { CustomerIdInput, ErasureView } from '@/lib/contracts/keeping';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readCustomerRecord } from './customer-record';
import { countOpenVisits } from './open-visits';

/** What an erasure would take away; nothing is changed. */
export async function previewErasure(
  ctx: PersonContext,
  { customerId }: CustomerIdInput,
): Promise<ErasureView> {
  mustBeAllowed(ctx, 'customers:erase');
  const record = await readCustomerRecord(ctx.db, ctx.shop.id, customerId);
  if (!record) throw notFound('customer');
  return {
    customerName: record.customer.name,
    jobs: record.jobs.length,
    visits: record.visits.length,
    messages: record.messages.length,
    files: record.files.length,
    signatures: record.signOffs.length,
    openVisits: await countOpenVisits(ctx.db, ctx.shop.id, customerId),
    erasedAt: record.customer.erasedAt?.toISOString() ?? null,
  };
}
