import { and, eq } from 'drizzle-orm';
import { customers } from '@/db/schema';
import type { EraseCustomerInput } from '@/lib/contracts/keeping';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { forgetCustomer } from './forget-customer';
import { countOpenVisits } from './open-visits';
import { removeBytes } from './remove-bytes';

/**
 * Forgets who a customer was. The jobs, their times and their sizes stay for the numbers; the name, the
 * address, the texts, the photos and the signatures go, and a "stop" stays as a keyed hash.
 */
export async function eraseCustomer(
  ctx: PersonContext,
  { customerId, nameAgain }: EraseCustomerInput,
): Promise<{ erasedAt: string }> {
  mustBeAllowed(ctx, 'customers:erase');
  const { erasedAt, storageKeys } = await ctx.db.transaction(async (tx) => {
    const [customer] = await tx
      .select({ name: customers.name, erasedAt: customers.erasedAt })
      .from(customers)
      .where(and(eq(customers.shopId, ctx.shop.id), eq(customers.id, customerId)))
      .for('update');
    if (!customer) throw notFound('customer');
    if (customer.erasedAt) return { erasedAt: customer.erasedAt, storageKeys: [] };
    mustMatch(customer.name, nameAgain);
    mustHaveNoVisits(await countOpenVisits(tx, ctx.shop.id, customerId));
    const forgotten = await forgetCustomer(tx, { shopId: ctx.shop.id, customerId, now: ctx.now });
    await writeAudit(tx, ctx, {
      verb: 'erase-customer',
      subjectKind: 'customer',
      subjectId: customerId,
      jobId: forgotten.jobIds[0],
      summary: 'This customer was erased; sizes and times stay',
    });
    return { erasedAt: ctx.now, storageKeys: forgotten.storageKeys };
  });
  await removeBytes(storageKeys);
  return { erasedAt: erasedAt.toISOString() };
}

function mustMatch(name: string, nameAgain: string): void {
  if (nameAgain.trim().toLowerCase() === name.trim().toLowerCase()) return;
  throw new Refusal({
    status: 422,
    code: 'name-differs',
    message: `Type the customer's name as it stands here: ${name}. Nothing was erased.`,
    errors: { nameAgain: 'This is not the name.' },
  });
}

function mustHaveNoVisits(open: number): void {
  if (open === 0) return;
  throw new Refusal({
    status: 409,
    code: 'visits-open',
    message: `There ${open === 1 ? 'is 1 visit' : `are ${open} visits`} still to come. Call off first; nothing was erased.`,
  });
}
