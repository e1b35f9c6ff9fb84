import { eq, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { consents, customers, jobs, shops, sites } from '@/db/schema';
import type { StartJobInput } from '@/lib/contracts/jobs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { phoneOf } from './phone-of';

/** The call that starts it all: customer, site and job, with what the customer agreed to, or nothing. */
export async function startJob(ctx: PersonContext, input: StartJobInput) {
  mustBeAllowed(ctx, 'jobs:change');
  const phone = phoneOf(ctx.shop, input.customer.phone);
  return ctx.db.transaction(async (tx) => {
    const shopId = ctx.shop.id;
    const { mayText, mayEmail, ...customer } = input.customer;
    const customerId = await written(
      tx
        .insert(customers)
        .values({ shopId, ...customer, phone })
        .returning({ id: customers.id }),
    );
    await writeConsents(tx, ctx, {
      customerId,
      sms: mayText && phone !== '',
      email: mayEmail && customer.email !== '',
    });
    const siteId = await written(
      tx
        .insert(sites)
        .values({ shopId, customerId, zone: ctx.shop.zone, ...input.site })
        .returning({ id: sites.id }),
    );
    const number = await nextNumber(tx, shopId);
    const { title, roomCount, unitCount, wallsReady, siteReadyOn, notes } = input;
    const jobId = await written(
      tx
        .insert(jobs)
        .values({
          shopId,
          number,
          customerId,
          siteId,
          title,
          roomCount,
          unitCount,
          wallsReady,
          siteReadyOn,
          notes,
        })
        .returning({ id: jobs.id }),
    );
    await writeAudit(tx, ctx, {
      verb: 'start-job',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary: `Job ${number} started: ${title}`,
    });
    return { jobId, number };
  });
}

/** Taking the number locks the shop's row, so two calls at once get two numbers. */
async function nextNumber(tx: Transaction, shopId: string): Promise<number> {
  const [taken] = await tx
    .update(shops)
    .set({ nextJobNumber: sql`${shops.nextJobNumber} + 1` })
    .where(eq(shops.id, shopId))
    .returning({ next: shops.nextJobNumber });
  if (!taken) throw new Error('the shop is gone');
  return taken.next - 1;
}

async function writeConsents(
  tx: Transaction,
  ctx: PersonContext,
  given: { customerId: string; sms: boolean; email: boolean },
): Promise<void> {
  const rows = (['sms', 'email'] as const)
    .filter((channel) => given[channel])
    .map((channel) => ({
      shopId: ctx.shop.id,
      customerId: given.customerId,
      channel,
      given: true,
      how: 'asked when the job was taken',
      byPersonId: ctx.actor.personId,
      at: ctx.now,
    }));
  if (rows.length > 0) await tx.insert(consents).values(rows);
}

async function written(rows: Promise<{ id: string }[]>): Promise<string> {
  const [row] = await rows;
  if (!row) throw new Error('a row of the new job was not written');
  return row.id;
}
