import type { CheckKind } from '@/lib/measure/rules/rule-set';

/** What each check looks at, as the trade says it. */
export const checkWords: Record<CheckKind, string> = {
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
  'counter-parallel-to-floor': 'Counter along the floor',
  'gap-at-wall': 'Gap at a wall',
  'joint-wood': 'Joint, wood to wood',
  'joint-wood-nonwood': 'Joint, wood to another stuff',
  'pieces-against-whole': 'Pieces against the whole',
  aisle: 'Aisle',
};
