import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';

type Settings = Pick<ShopSettings, 'fit' | 'booking' | 'checklists' | 'keeping'> &
  Partial<Pick<ShopSettings, 'name' | 'phone' | 'email' | 'zone'>>;

const plain = ['name', 'phone', 'email', 'zone'] as const;

/**
 * What takes one change of the shop's rules back: the rules as they are now, with what that change touched
 * as it was before it. Later changes of other rules stay.
 *
 * Edge: a rule that was changed again since goes back past that change as well; what was left to the usual
 * goes back to the usual.
 * Example: a change of the arrival window from 120 to 90, with hours changed after it: the window is 120
 * again, and the hours stay.
 */
export function changeBack(
  now: Settings,
  { before, given }: { before: Settings; given: ChangeShopRulesInput },
): ChangeShopRulesInput {
  const back: ChangeShopRulesInput = {};
  for (const key of plain) {
    if (given[key] !== undefined && given[key] !== before[key]) back[key] = before[key];
  }
  if (given.fit) back.fit = partBack(now.fit, before.fit, given.fit);
  if (given.booking) back.booking = partBack(now.booking, before.booking, given.booking);
  if (given.keeping) back.keeping = before.keeping ?? { customerYears: null };
  if (given.checklists) back.checklists = before.checklists ?? {};
  return back;
}

function partBack<Part extends object>(now: Part, before: Part, given: Part): Part {
  const keys = Object.keys(given) as (keyof Part)[];
  const touched = keys.filter((key) => JSON.stringify(given[key]) !== JSON.stringify(before[key]));
  return { ...now, ...Object.fromEntries(touched.map((key) => [key, before[key]])) };
}
