import { asc, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, sites } from '@/db/schema';
import type { StartJobInput } from '@/lib/contracts/jobs';
import type { Context } from '@/server/base/context';

export type Double = {
  /** "the phone of Robin Testwood, job 12". */
  words: string;
  /** The customer to whom a further job belongs; null where only the address is the same. */
  customerId: string | null;
};
type Known = { customerId: string; name: string; jobNumber: number };

/** Streets are alike when their letters and figures are. */
export function addressKey({ street, town }: { street: string; town: string }): string {
  return `${street} ${town}`
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

/** For each job of a list, whether the shop knows its customer's phone, e-mail or address already. */
export async function findDoubles(
  db: Database,
  ctx: Context,
  list: readonly (StartJobInput | null)[],
): Promise<(Double | null)[]> {
  if (list.every((job) => job === null)) return list.map(() => null);
  // All of the shop's: a database with other letters than ours would find other addresses alike.
  const rows = await db
    .select({
      customerId: customers.id,
      name: customers.name,
      phone: customers.phone,
      email: customers.email,
      street: sites.street,
      town: sites.town,
      jobNumber: jobs.number,
    })
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(eq(jobs.shopId, ctx.shop.id))
    .orderBy(asc(jobs.number));
  const by = {
    phone: new Map<string, Known>(),
    email: new Map<string, Known>(),
    address: new Map<string, Known>(),
  };
  for (const { phone, email, street, town, ...known } of rows) {
    if (phone) by.phone.set(phone, known);
    if (email) by.email.set(email.toLowerCase(), known);
    by.address.set(addressKey({ street, town }), known);
  }
  return list.map((job) => {
    if (!job) return null;
    const { phone, email } = job.customer;
    const person = by.phone.get(phone) ?? by.email.get(email);
    if (person) {
      const what = by.phone.has(phone) ? 'phone' : 'e-mail';
      return { words: knownWords(what, person), customerId: person.customerId };
    }
    const place = by.address.get(addressKey(job.site));
    return place ? { words: knownWords('address', place), customerId: null } : null;
  });
}

const knownWords = (what: string, { name, jobNumber }: Known) =>
  `the ${what} of ${name}, job ${jobNumber}`;
