import type { CheckKind } from '@/lib/measure/rules/rule-set';
import { type Region, tradeName } from '@/lib/words/trade';

/** What a check looks at, as the trade of the region says it. */
export function checkWords(check: CheckKind, region: Region): string {
  return check === 'counter-parallel-to-floor'
    ? `${tradeName('counter', region)} along the floor`
    : words[check];
}

const words: Record<Exclude<CheckKind, 'counter-parallel-to-floor'>, string> = {
  'wall-straightness': 'Wall, straight',
  'wall-plumb': 'Wall, plumb',
  'corner-square': 'Corner, square',
  'floor-fall': 'Floor, level',
  'floor-straightness': 'Floor, flat',
  'ceiling-fall': 'Ceiling, level',
  'ceiling-straightness': 'Ceiling, flat',
  'cabinet-plumb-level': 'Cabinets, plumb and level',
  'cabinet-faces-in-line': 'Cabinet faces, in line',
  'cabinet-corners-in-line': 'Cabinet corners, in line',
  'cabinet-warp': 'Cabinets, warp',
  'gap-at-wall': 'Gap at a wall',
  'joint-wood': 'Joint, wood to wood',
  'joint-wood-nonwood': 'Joint, wood to another material',
  'pieces-against-whole': 'Pieces against the whole',
  aisle: 'Aisle',
};
