import type { Tool } from '@/lib/contracts/wall-book';
import type { LengthUnit } from '@/lib/units/brands';

/** What most vans carry; the shop changes them to what its own sheets say. Accuracy: common practice. */
export function startingTools(unit: LengthUnit): Omit<Tool, 'id'>[] {
  const stepMm = unit === 'in' ? 25.4 / 16 : 1;
  return [
    {
      name: 'Tape, class II',
      spec: { kind: 'tape', accuracyClass: 'II', stepMm, repeatabilityMm: 0.3 },
    },
    {
      name: 'Laser meter',
      spec: {
        kind: 'laser',
        mpeMm: 1.5,
        stepMm: unit === 'in' ? 25.4 / 32 : 1,
        repeatabilityMm: 0.3,
      },
    },
    {
      name: 'Angle finder',
      spec: { kind: 'angle-finder', mpeDeg: 0.1, stepDeg: 0.1, repeatabilityDeg: 0.05 },
    },
    {
      name: 'Level and feelers',
      spec: { kind: 'level', mpeMmPerM: 0.5, stepMm: 0.5, repeatabilityMm: 0.3 },
    },
  ];
}
