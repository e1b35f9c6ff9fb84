import { eq, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { consents, customers, jobs, shops, sites } from '@/db/schema';
import type { StartJobInput } from '@/lib/contracts/jobs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { phoneOf } from '@/server/shops/phone-of';
import { refusedBefore } from './kept-refusals';

/** The call that starts it all: customer, site and job, with what the customer agreed to, or nothing. */
export async function startJob(ctx: PersonContext, input: StartJobInput) {
  mustBeAllowed(ctx, 'jobs:change');
  const phone = phoneOf(ctx.shop, input.customer.phone, 'customer.phone');
  return ctx.db.transaction(async (tx) => {
    const shopId = ctx.shop.id;
    const { mayText, mayEmail, ...customer } = input.customer;
    const customerId = await written(
      tx
        .insert(customers)
        .values({ shopId, ...customer, phone })
        .returning({ id: customers.id }),
    );
    const refused = await refusedBefore(tx, shopId, { phone, email: customer.email });
    await writeConsents(tx, ctx, {
      customerId,
      sms: mayText && phone !== '',
      email: customer.email === '' ? null : mayEmail,
    });
    await writeKeptRefusals(tx, ctx, customerId, refused);
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
    return { id: jobId, number };
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

/**
 * A text needs a yes, so no row is written where nobody asked; an e-mail about one's own visit needs
 * only that it was not refused, so a no is written down as well.
 */
async function writeConsents(
  tx: Transaction,
  ctx: PersonContext,
  customer: { customerId: string; sms: boolean; email: boolean | null },
): Promise<void> {
  const row = (channel: 'sms' | 'email', given: boolean) => ({
    shopId: ctx.shop.id,
    customerId: customer.customerId,
    channel,
    given,
    how: given ? 'agreed when the job was taken' : 'not agreed when the job was taken',
    byPersonId: ctx.actor.personId,
    at: ctx.now,
  });
  const rows = [
    ...(customer.sms ? [row('sms', true)] : []),
    ...(customer.email === null ? [] : [row('email', customer.email)]),
  ];
  if (rows.length > 0) await tx.insert(consents).values(rows);
}

/** Who said stop before is not told because somebody ticked a box: they have to say so themselves. */
async function writeKeptRefusals(
  tx: Transaction,
  ctx: PersonContext,
  customerId: string,
  refused: ReadonlySet<'sms' | 'email'>,
): Promise<void> {
  const rows = [...refused].map((channel) => ({
    shopId: ctx.shop.id,
    customerId,
    channel,
    given: false,
    how:
      channel === 'sms' ? 'said stop before, from this number' : 'refused before, at this address',
    at: ctx.now,
  }));
  if (rows.length > 0) await tx.insert(consents).values(rows);
}

async function written(rows: Promise<{ id: string }[]>): Promise<string> {
  const [row] = await rows;
  if (!row) throw new Error('a row of the new job was not written');
  return row.id;
}
