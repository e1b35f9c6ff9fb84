import type { Unit, UnitKind } from '@/lib/contracts/runs';
import { type Region, tradeName } from '@/lib/words/trade';

/** One name for each kind of unit, as the shop's region calls it. */
export function unitKindName(kind: UnitKind, region: Region): string {
  switch (kind) {
    case 'wall':
      return tradeName('wallUnit', region);
    case 'tall':
      return tradeName('tallUnit', region);
    case 'dishwasher':
    case 'range':
    case 'refrigerator':
    case 'hood':
      return tradeName(kind, region);
    case 'panel':
      return 'End panel';
    default:
      return kind.charAt(0).toUpperCase() + kind.slice(1);
  }
}

/** The unit's own name, else its kind. */
export function unitWords(unit: Pick<Unit, 'name' | 'kind'>, region: Region = 'US'): string {
  return unit.name || unitKindName(unit.kind, region);
}
