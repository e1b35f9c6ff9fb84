import type { PadAsk, PadField } from './pad-fields';

const x: PadField = { name: 'placeX', label: 'along', kind: 'position' };
const y: PadField = { name: 'placeY', label: 'out', kind: 'position' };
const z: PadField = { name: 'placeZ', label: 'up', kind: 'height' };

/** Where a reading is taken that nobody asked for: the places come before the value. */
export function placeFields(ask: PadAsk): PadField[] {
  switch (ask.kind) {
    case 'length':
    case 'pieces':
    case 'corner':
    case 'diagonal':
      return [z];
    case 'face':
      return [x, z];
    case 'floor':
    case 'ceiling':
      return [x, y];
    case 'width':
      return [x, z];
    case 'stud':
    case 'doorway':
      return [];
  }
}

/**
 * The question with its places as typed.
 *
 * Edge: a place that was not typed stays as the question has it.
 * Example: ask face at x 0, z 0, typed 600 and 910: face at 600, 910.
 */
export function askAtPlace(ask: PadAsk, values: Record<string, number>): PadAsk {
  const { placeX, placeY, placeZ } = values;
  return {
    ...ask,
    ...('xMm' in ask && placeX !== undefined ? { xMm: placeX } : {}),
    ...('yMm' in ask && placeY !== undefined ? { yMm: placeY } : {}),
    ...('zMm' in ask && placeZ !== undefined ? { zMm: placeZ } : {}),
  };
}
