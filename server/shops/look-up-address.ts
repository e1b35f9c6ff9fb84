import { and, eq, gt, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { addressAnswers } from '@/db/schema';
import type { FoundPlace } from '@/lib/contracts/travel';
import type { Context } from '@/server/base/context';
import type { GeocodeAnswer, GeocodePort } from '@/server/ports/geocode/geocode-port';

type Address = { street: string; town: string; postcode: string };

const keptDays = 90;

/** The country to look in; Europe has many. */
const countryOf = { US: 'US', UK: 'GB', AU: 'AU', EU: null } as const;

/** What the address service answered to the same words before; null where nobody asked lately. */
export async function keptPlaces(
  db: Database,
  ctx: Context,
  address: Address,
): Promise<FoundPlace[] | null> {
  const [kept] = await db
    .select({ places: addressAnswers.places })
    .from(addressAnswers)
    .where(
      and(
        eq(addressAnswers.shopId, ctx.shop.id),
        eq(addressAnswers.question, questionOf(address)),
        gt(addressAnswers.askedAt, new Date(ctx.now.getTime() - keptDays * 86_400_000)),
      ),
    );
  return kept?.places ?? null;
}

/** Asks the address service, in its pace, and keeps what it answers. Waits for the network. */
export async function askPlaces(
  ctx: Context,
  geocode: GeocodePort,
  address: Address,
): Promise<GeocodeAnswer> {
  const answer = await geocode.find({
    text: textOf(address),
    country: countryOf[ctx.shop.region],
  });
  if (!answer.ok) {
    ctx.log('no address service', { reason: answer.reason });
    return answer;
  }
  await ctx.db
    .insert(addressAnswers)
    .values({
      shopId: ctx.shop.id,
      question: questionOf(address),
      places: answer.places,
      askedAt: ctx.now,
    })
    .onConflictDoUpdate({
      target: [addressAnswers.shopId, addressAnswers.question],
      set: { places: sql`excluded.places`, askedAt: sql`excluded.asked_at` },
    });
  return answer;
}

/** Example: "14 Quay Rise, Quayside 02101". */
const textOf = ({ street, town, postcode }: Address): string =>
  [street, [town, postcode].filter(Boolean).join(' ')].filter(Boolean).join(', ');

const questionOf = (address: Address): string => textOf(address).toLowerCase().replace(/\s+/g, ' ');
