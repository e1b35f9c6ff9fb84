import { and, eq, type SQL } from 'drizzle-orm';
import { customers, jobs, signOffs, sites } from '@/db/schema';
import type { SignOffView } from '@/lib/contracts/sign-offs';
import { formatDay, formatTime } from '@/lib/time/format-instant';
import type { TextLocale } from '@/lib/time/text-locale';
import type { Context } from '@/server/base/context';
import { copyWords } from './copy-words';
import { readSignOffs } from './read-sign-offs';
import { signOffPdf } from './sign-off-pdf';

export type SignedCopy = { fileName: string; bytes: Uint8Array; signOffId: string };

/** The newest sign-off that meets the condition, as paper; null where nothing was signed. */
export async function makeCopy(ctx: Context, which: SQL): Promise<SignedCopy | null> {
  const signOff = (await readSignOffs(ctx.db, ctx, which)).at(-1);
  if (!signOff) return null;
  const [about] = await ctx.db
    .select({
      number: jobs.number,
      title: jobs.title,
      customerName: customers.name,
      street: sites.street,
      town: sites.town,
    })
    .from(signOffs)
    .innerJoin(jobs, eq(jobs.id, signOffs.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(signOffs.shopId, ctx.shop.id), eq(signOffs.id, signOff.id)));
  if (!about) return null;
  const bytes = await signOffPdf({
    signOff,
    signedWords: signedWords(ctx, signOff),
    shopName: ctx.shop.name,
    customerName: about.customerName,
    address: [about.street, about.town].filter(Boolean).join(', '),
    job: `${about.number} · ${about.title}`,
    size: ctx.shop.region === 'US' ? 'letter' : 'A4',
  });
  return { fileName: copyWords[signOff.language].fileName, bytes, signOffId: signOff.id };
}

/** When it was signed, in the language that it was signed in. */
function signedWords({ shop }: Context, { signedAt, language }: SignOffView): string {
  const locale: TextLocale = { language, region: shop.region };
  const at = new Date(signedAt);
  return `${formatDay(at, shop.zone, locale)}, ${formatTime(at, shop.zone, locale)}`;
}
