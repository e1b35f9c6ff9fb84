import { and, eq, ilike, or, type SQL, sql } from 'drizzle-orm';
import { customers, jobs, sites } from '@/db/schema';

/** Fewer digits than this would match half of all phone numbers. */
const fewestPhoneDigits = 4;
const mostWords = 6;

/**
 * Each word typed is to be found somewhere: "alder stonebeck" finds the Alders of Stonebeck. For a query over jobs
 * joined with their customers and sites.
 */
export function jobMatches(search: string): SQL | undefined {
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
