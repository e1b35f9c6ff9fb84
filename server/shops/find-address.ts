import type { FindAddressInput, FoundAddress } from '@/lib/contracts/travel';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { countTry } from '@/server/base/limits';
import { getPorts } from '@/server/ports/choose-ports';
import { askPlaces, keptPlaces } from './look-up-address';

/** More than anybody types; a form that asks at every letter would be a mistake of ours. */
const limit = { most: 60, windowSeconds: 60 };

/** Where a typed address is. When nobody answers, the pin is put by hand. */
export async function findAddress(
  ctx: PersonContext,
  input: FindAddressInput,
): Promise<FoundAddress> {
  mustBeAllowed(ctx, 'jobs:read');
  const kept = await keptPlaces(ctx.db, ctx, input);
  if (kept) return { places: kept, isAnswered: true };

  await countTry(ctx.db, `find-address:${ctx.shop.id}`, limit, ctx.now);
  const answer = await askPlaces(ctx, (await getPorts()).geocode, input);
  return answer.ok
    ? { places: answer.places, isAnswered: true }
    : { places: [], isAnswered: false };
}
