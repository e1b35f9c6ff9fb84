import type { SheetView } from '@/lib/contracts/rooms';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { type CrookedKitchen, crookedKitchen } from './crooked-kitchen';

/** A released sheet as the server gives it, of a kitchen badly out of true unless another is given. */
export function releasedSheet(
  change: Partial<SheetView> = {},
  {
    kitchen = crookedKitchen(),
    rules = defaultShopRules('US').fit,
  }: { kitchen?: CrookedKitchen; rules?: FitRules } = {},
): SheetView {
  const fit = fitRoom(kitchen.wallBook, kitchen.runs, rules);
  return {
    release: {
      id: '00000000-0000-4000-8000-0000000fffff',
      revision: 'B',
      releasedAtWords: 'Tue, Dec 1, 2:05 PM',
      releasedBy: 'Ines Testwell',
      changes: [
        'Sink wall: sink 36" is now 33"',
        'Sink wall, filler left: blank 2 1/2" is now 2 9/16"',
      ],
      takenUpWords: null,
      isSuperseded: false,
    },
    overrideReason: '',
    jobId: '00000000-0000-4000-8000-0000000ffffe',
    jobNumber: 2418,
    jobTitle: 'Kitchen, L, 11 units',
    customerName: 'Robin Testwood',
    street: '12 Alder Row',
    shopName: 'Juniper Bend',
    roomName: kitchen.wallBook.room.name,
    ...kitchen,
    rules,
    fit,
    engineVersion: fit.engineVersion,
    measuredWords: 'Ines Testwell; Tue, Dec 1; Laser meter, Tape, class II',
    isOldHouse: true,
    revised: null,
    newerRevision: null,
    supersededBy: [],
    ...change,
  };
}
