import { randomUUID } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { customers, jobs, shops, sites } from '@/db/schema';
import type { ImportedList, ImportListInput } from '@/lib/contracts/job-lists';
import type { StartJobInput } from '@/lib/contracts/jobs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { onlyOnce } from '@/server/base/only-once';
import { Refusal } from '@/server/base/problem-response';
import { type ReadRow, readList } from './read-list';

type TakenRow = ReadRow & { job: StartJobInput };

const rowsAtOnce = 500;

/** Begins the jobs of a list: all that were shown, or none, and once however often it is sent. */
export async function importList(
  ctx: PersonContext,
  input: ImportListInput & { bytes: Uint8Array },
): Promise<ImportedList> {
  mustBeAllowed(ctx, 'jobs:change');
  const { idempotencyKey: key, leaveOutProblems, takeDoubles } = input;
  return ctx.db.transaction((tx) =>
    onlyOnce(tx, ctx, { verb: 'import-list', key }, async () => {
      // Numbers are taken first: two lists at once come in one after the other, and each sees the other's rows.
      await lockShop(tx, ctx);
      const { rows } = await readList(tx, ctx, input);
      const good = rows.filter((row): row is TakenRow => row.job !== null);
      if (good.length < rows.length && leaveOutProblems === 'no') throw hasProblems(rows);
      const taken = good.filter(({ double }) => double === '' || takeDoubles === 'yes');
      await write(tx, ctx, taken);
      return { jobs: taken.length, leftOut: rows.length - taken.length };
    }),
  );
}

async function write(tx: Transaction, ctx: PersonContext, rows: TakenRow[]): Promise<void> {
  if (rows.length === 0) return;
  const shopId = ctx.shop.id;
  const firstNumber = await takeNumbers(tx, ctx, rows.length);
  const customerOfRow = new Map<number, string>();
  const made = rows.map(({ row, job, sameAs }, index) => {
    const known = sameAs && ('row' in sameAs ? customerOfRow.get(sameAs.row) : sameAs.customerId);
    const customerId = known ?? randomUUID();
    customerOfRow.set(row, customerId);
    const ids = { customerId, siteId: randomUUID(), jobId: randomUUID() };
    return { ...ids, isNewCustomer: !known, number: firstNumber + index, job };
  });
  for (let start = 0; start < made.length; start += rowsAtOnce) {
    const some = made.slice(start, start + rowsAtOnce);
    const fresh = some.filter(({ isNewCustomer }) => isNewCustomer);
    if (fresh.length > 0) {
      await tx.insert(customers).values(
        fresh.map(({ customerId, job }) => {
          const { name, phone, email, language } = job.customer;
          return { shopId, id: customerId, name, phone, email, language };
        }),
      );
    }
    await tx.insert(sites).values(
      some.map(({ siteId, customerId, job }) => ({
        shopId,
        id: siteId,
        customerId,
        zone: ctx.shop.zone,
        ...job.site,
        // Pins that the list does not give are looked up afterwards (place-due-sites).
        placeDueAt: job.site.latitude === null ? ctx.now : null,
      })),
    );
    await tx.insert(jobs).values(
      some.map(({ jobId, number, customerId, siteId, job }) => {
        const { title, roomCount, unitCount, wallsReady, siteReadyOn, notes } = job;
        const facts = { title, roomCount, unitCount, wallsReady, siteReadyOn, notes };
        return { shopId, id: jobId, number, customerId, siteId, ...facts };
      }),
    );
  }
  for (const { jobId, number, job } of made) {
    await writeAudit(tx, ctx, {
      verb: 'import-list',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary: `Job ${number} started from a list: ${job.title}`,
    });
  }
}

async function lockShop(tx: Transaction, ctx: PersonContext): Promise<void> {
  await tx.select({ id: shops.id }).from(shops).where(eq(shops.id, ctx.shop.id)).for('update');
}

async function takeNumbers(tx: Transaction, ctx: PersonContext, count: number): Promise<number> {
  const [taken] = await tx
    .update(shops)
    .set({ nextJobNumber: sql`${shops.nextJobNumber} + ${count}` })
    .where(eq(shops.id, ctx.shop.id))
    .returning({ next: shops.nextJobNumber });
  if (!taken) throw new Error('the shop is gone');
  return taken.next - count;
}

function hasProblems(rows: readonly ReadRow[]): Refusal {
  const bad = rows.filter(({ problems }) => problems.length > 0);
  const first = bad[0];
  return new Refusal({
    status: 422,
    code: 'list-has-problems',
    message: `Nothing was imported. ${bad.length} rows are not as they should be, the first is row ${first?.row}: ${first?.problems[0]} Mend the list, or leave those rows out.`,
  });
}
