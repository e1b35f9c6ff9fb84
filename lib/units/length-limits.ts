/** What a length is of; each kind has a least and a largest length that a reading can be. */
export type LengthKind =
  | 'length'
  | 'leg'
  | 'corner-diagonal'
  | 'gap'
  | 'drop'
  | 'rise'
  | 'diagonal'
  | 'width'
  | 'position'
  | 'height'
  | 'projection'
  | 'doorway'
  | 'unit-width'
  | 'depth'
  | 'thickness';

export type LengthLimits = {
  /** As it stands in a sentence: "A wall length". */
  name: string;
  leastMm: number;
  mostMm: number;
  mayBeZero: boolean;
};

/** Common practice, no source: past these a reading is a slip of the finger or of the unit. */
export const lengthLimits: Record<LengthKind, LengthLimits> = {
  length: { name: 'A wall length', leastMm: 0, mostMm: 30_000, mayBeZero: false },
  leg: { name: 'A leg', leastMm: 0, mostMm: 10_000, mayBeZero: false },
  'corner-diagonal': { name: 'A diagonal', leastMm: 0, mostMm: 20_000, mayBeZero: false },
  gap: { name: 'A gap', leastMm: -300, mostMm: 300, mayBeZero: true },
  drop: { name: 'A drop', leastMm: 0, mostMm: 3_000, mayBeZero: true },
  rise: { name: 'A rise', leastMm: 0, mostMm: 10_000, mayBeZero: true },
  diagonal: { name: 'A diagonal', leastMm: 0, mostMm: 40_000, mayBeZero: false },
  width: { name: 'A width', leastMm: 0, mostMm: 30_000, mayBeZero: false },
  position: { name: 'A place along the wall', leastMm: -5_000, mostMm: 30_000, mayBeZero: true },
  height: { name: 'A height', leastMm: -2_000, mostMm: 12_000, mayBeZero: true },
  projection: { name: 'A projection', leastMm: -500, mostMm: 2_000, mayBeZero: true },
  doorway: { name: 'A doorway', leastMm: 0, mostMm: 6_000, mayBeZero: false },
  'unit-width': { name: 'A unit', leastMm: 0, mostMm: 5_000, mayBeZero: false },
  depth: { name: 'A depth', leastMm: 0, mostMm: 2_000, mayBeZero: false },
  thickness: { name: 'A thickness', leastMm: 0, mostMm: 200, mayBeZero: true },
};

/** Where the kind is not said: the widest a reading may be anywhere. */
export const anyLengthLimits: LengthLimits = {
  name: 'A length',
  leastMm: 0,
  mostMm: 100_000,
  mayBeZero: true,
};
