import { and, desc, eq, ilike, or, type SQL, sql } from 'drizzle-orm';
import { customers, jobs, sites } from '@/db/schema';
import type { JobRow, ListJobsInput } from '@/lib/contracts/jobs';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { jobRowFields } from './job-fields';
import { nextVisitWords } from './next-visits';

/** More than anybody reads; the search narrows it. */
const mostRows = 300;
/** Fewer digits than this would match half of all phone numbers. */
const fewestPhoneDigits = 4;
const mostWords = 6;

/** Jobs, newest first, by any part of name, street, town, title, notes, e-mail or phone, or by number. */
export async function listJobs(ctx: PersonContext, input: ListJobsInput): Promise<JobRow[]> {
  mustBeAllowed(ctx, 'jobs:read');
  const rows = await ctx.db
    .select(jobRowFields)
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(jobs.shopId, ctx.shop.id),
        input.stage ? eq(jobs.stage, input.stage) : undefined,
        input.search ? matches(input.search) : undefined,
      ),
    )
    .orderBy(desc(jobs.number))
    .limit(mostRows);
  const next = await nextVisitWords(
    ctx,
    ctx.db,
    rows.map(({ id }) => id),
  );
  return rows.map((row) => ({
    ...row,
    createdAt: row.createdAt.toISOString(),
    nextVisit: next.get(row.id) ?? null,
  }));
}

/** Each word typed is to be found somewhere: "alder stonebeck" finds the Alders of Stonebeck. */
function matches(search: string): SQL | undefined {
  const words = search.split(/\s+/).filter(Boolean).slice(0, mostWords);
  const digits = search.replace(/\D/g, '');
  const isPhone = digits.length >= fewestPhoneDigits && !/[a-z]/i.test(search);
  return or(
    and(...words.map(wordMatches)),
    // A number is kept as +1…; whoever types it may begin with the trunk 0, which is not kept.
    isPhone ? sql`${customers.phone} like ${`%${digits.replace(/^0/, '')}%`}` : undefined,
  );
}

function wordMatches(word: string): SQL | undefined {
  const part = `%${word.replace(/[\\%_]/g, '\\$&')}%`;
  const number = /^#?(\d{1,9})$/.exec(word)?.[1];
  return or(
    ilike(customers.name, part),
    ilike(customers.email, part),
    ilike(sites.street, part),
    ilike(sites.town, part),
    ilike(sites.postcode, part),
    ilike(jobs.title, part),
    ilike(jobs.notes, part),
    number ? eq(jobs.number, Number(number)) : undefined,
  );
}
