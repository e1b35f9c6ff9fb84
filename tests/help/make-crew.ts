import { createCrewInput } from '@/lib/contracts/visits';
import { createCrew } from '@/server/shops/create-crew';
import { contextOf, type TestShop } from './make-shop';

let made = 0;

/** A crew of this shop; its people are the shop's fitter or measurer where none are named. */
export async function makeCrew(
  shop: TestShop,
  does: 'measure' | 'fit' = 'measure',
  personIds = [shop.people[does === 'fit' ? 'crew' : 'measurer'].personId],
): Promise<{ crewId: string; name: string }> {
  made += 1;
  const name = `${does === 'fit' ? 'Fitters' : 'Measure'} ${made}`;
  const input = createCrewInput.parse({ name, does, colour: '1', personIds });
  const { id } = await createCrew(await contextOf(shop, 'owner'), input);
  return { crewId: id, name };
}
