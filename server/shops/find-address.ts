import { and, eq, gt, sql } from 'drizzle-orm';
import { addressAnswers } from '@/db/schema';
import type { FindAddressInput, FoundAddress } from '@/lib/contracts/travel';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { countTry } from '@/server/base/limits';
import { getPorts } from '@/server/ports/choose-ports';

const keptDays = 90;
/** More than anybody types; a form that asks at every letter would be a mistake of ours. */
const limit = { most: 60, windowSeconds: 60 };

/** The country to look in; Europe has many. */
const countryOf = { US: 'US', UK: 'GB', AU: 'AU', EU: null } as const;

/** Where a typed address is. When nobody answers, the pin is put by hand. */
export async function findAddress(
  ctx: PersonContext,
  input: FindAddressInput,
): Promise<FoundAddress> {
  mustBeAllowed(ctx, 'jobs:read');
  const text = [input.street, [input.town, input.postcode].filter(Boolean).join(' ')]
    .filter(Boolean)
    .join(', ');
  const question = text.toLowerCase().replace(/\s+/g, ' ');
  const [kept] = await ctx.db
    .select({ places: addressAnswers.places })
    .from(addressAnswers)
    .where(
      and(
        eq(addressAnswers.shopId, ctx.shop.id),
        eq(addressAnswers.question, question),
        gt(addressAnswers.askedAt, new Date(ctx.now.getTime() - keptDays * 86_400_000)),
      ),
    );
  if (kept) return { places: kept.places, isAnswered: true };

  await countTry(ctx.db, `find-address:${ctx.shop.id}`, limit, ctx.now);
  const answer = await (await getPorts()).geocode.find({
    text,
    country: countryOf[ctx.shop.region],
  });
  if (!answer.ok) {
    ctx.log('no address service', { reason: answer.reason });
    return { places: [], isAnswered: false };
  }
  await ctx.db
    .insert(addressAnswers)
    .values({ shopId: ctx.shop.id, question, places: answer.places, askedAt: ctx.now })
    .onConflictDoUpdate({
      target: [addressAnswers.shopId, addressAnswers.question],
      set: { places: sql`excluded.places`, askedAt: sql`excluded.asked_at` },
    });
  return { places: answer.places, isAnswered: true };
}
