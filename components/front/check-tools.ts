import type { Tool } from '@/lib/contracts/wall-book';
import type { LengthUnit } from '@/lib/units/brands';
import { MM_PER_INCH } from '@/lib/units/fraction-parts';

/** What the open checks reckon with, because nobody has said what is in the van. Accuracy: common practice. */
export function checkTape(unit: LengthUnit): Tool {
  return {
    id: '00000000-0000-4000-8000-000000000001',
    name: 'Tape, class II',
    spec: { kind: 'tape', accuracyClass: 'II', stepMm: readStepMm(unit), repeatabilityMm: 0.3 },
  };
}

/** A level with a rule for the gaps beside it. */
export function checkLevel(unit: LengthUnit): Tool {
  return {
    id: '00000000-0000-4000-8000-000000000002',
    name: 'Level and rule',
    spec: { kind: 'level', mpeMmPerM: 0.5, stepMm: gapStepMm(unit), repeatabilityMm: 0.3 },
  };
}

/** The mark to which a tape is read and a size is shown. */
export function readStepMm(unit: LengthUnit): number {
  return unit === 'in' ? MM_PER_INCH / 16 : 1;
}

/** A gap is read finer than a length. */
export function gapStepMm(unit: LengthUnit): number {
  return unit === 'in' ? MM_PER_INCH / 32 : 0.5;
}
