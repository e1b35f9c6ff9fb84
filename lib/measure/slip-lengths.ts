/** Whole amounts that are lost or gained with a tape or a laser; common practice, no source. */
export const SLIP_LENGTHS_MM = [
  { name: '10 mm', lengthMm: 10 },
  { name: '1/2 in', lengthMm: 12.7 },
  { name: '1 in', lengthMm: 25.4 },
  { name: '100 mm', lengthMm: 100 },
  { name: '1 ft', lengthMm: 304.8 },
] as const;
