/** Minutes per item of work: what a new shop starts with. Its own times correct them. */

export type DurationRow = {
  item: string;
  /** Minutes of one person, per one of `per`. */
  minutes: number;
  low: number;
  high: number;
  per: 'unit' | 'piece' | 'metre' | 'job' | 'room' | 'visit' | 'snag' | 'unit and floor';
  /** Ids in `durationSources`, or "common practice, no source". */
  basis: string;
};

const OURS = 'common practice, no source';

export const durationTable = {
  base: { item: 'Base unit set', minutes: 60, low: 30, high: 75, per: 'unit', basis: 'T01, T03' },
  wall: { item: 'Wall unit hung', minutes: 60, low: 30, high: 75, per: 'unit', basis: 'T01, T03' },
  cornerOrSink: {
    item: 'Corner or sink base set',
    minutes: 80,
    low: 60,
    high: 120,
    per: 'unit',
    basis: `${OURS}; on T01`,
  },
  tall: {
    item: 'Tall unit set',
    minutes: 105,
    low: 60,
    high: 150,
    per: 'unit',
    basis: `${OURS}; on T01`,
  },
  anyUnit: {
    item: 'Unit not yet laid out, with its share of fillers and trim',
    minutes: 75,
    low: 60,
    high: 120,
    per: 'unit',
    basis: 'T03',
  },
  filler: {
    item: 'Filler scribed',
    minutes: 25,
    low: 15,
    high: 60,
    per: 'piece',
    basis: `${OURS}; T01 as the upper bound`,
  },
  panel: {
    item: 'Finished end or panel scribed',
    minutes: 45,
    low: 30,
    high: 60,
    per: 'piece',
    basis: `${OURS}; T01 as the upper bound`,
  },
  refrigeratorSurround: {
    item: 'Refrigerator surround, two panels and a top',
    minutes: 150,
    low: 90,
    high: 240,
    per: 'piece',
    basis: OURS,
  },
  island: {
    item: 'Island fixed, beside its units',
    minutes: 90,
    low: 60,
    high: 180,
    per: 'piece',
    basis: OURS,
  },
  crown: { item: 'Crown', minutes: 25, low: 15, high: 40, per: 'metre', basis: OURS },
  lightRail: { item: 'Light rail', minutes: 12, low: 8, high: 20, per: 'metre', basis: OURS },
  kick: { item: 'Kick', minutes: 10, low: 6, high: 15, per: 'metre', basis: OURS },
  front: {
    item: 'Door or drawer adjusted, handle fitted',
    minutes: 5,
    low: 3,
    high: 8,
    per: 'piece',
    basis: OURS,
  },
  setUp: {
    item: 'Set up, protect, find the high point, draw lines',
    minutes: 120,
    low: 60,
    high: 180,
    per: 'job',
    basis: OURS,
  },
  clean: {
    item: 'Clean, photos, walk through with the customer',
    minutes: 90,
    low: 45,
    high: 120,
    per: 'job',
    basis: OURS,
  },
  stripOut: {
    item: 'Strip out the old kitchen',
    minutes: 240,
    low: 240,
    high: 480,
    per: 'job',
    basis: 'T02, T08',
  },
  carryUp: {
    item: 'Carry up or down a floor by stairs',
    minutes: 4,
    low: 2,
    high: 8,
    per: 'unit and floor',
    basis: OURS,
  },
  measureKitchen: {
    item: 'Measure a kitchen',
    minutes: 90,
    low: 60,
    high: 120,
    per: 'room',
    basis: 'M30',
  },
  measureOneWall: {
    item: 'Measure one wall or a vanity',
    minutes: 45,
    low: 30,
    high: 60,
    per: 'room',
    basis: OURS,
  },
  checkMeasure: {
    item: 'Check measure',
    minutes: 45,
    low: 15,
    high: 60,
    per: 'room',
    basis: 'M30',
  },
  template: {
    item: 'Worktop template',
    minutes: 90,
    low: 60,
    high: 180,
    per: 'visit',
    basis: 'T13',
  },
  deliveryCheck: {
    item: 'Check a delivery against its list',
    minutes: 15,
    low: 15,
    high: 30,
    per: 'visit',
    basis: 'T19',
  },
  unload: {
    item: 'Unload and carry in',
    minutes: 6,
    low: 3,
    high: 12,
    per: 'unit',
    basis: OURS,
  },
  returnVisit: {
    item: 'Return visit: set up, clean, walk through',
    minutes: 60,
    low: 30,
    high: 90,
    per: 'visit',
    basis: OURS,
  },
  snag: { item: 'Snag put right', minutes: 30, low: 10, high: 90, per: 'snag', basis: OURS },
} as const satisfies Record<string, DurationRow>;

export type DurationKey = keyof typeof durationTable;

/** What the published figures say, and where. Read 2026; none is a standard. */
export const durationSources = {
  T01: {
    says: 'One box is one hour, and every loose part counts as a box.',
    address: 'https://finehomebuilding.com/forum/how-long-to-install-cabinets',
  },
  T02: {
    says: 'Taking out the old kitchen takes about 4 hours.',
    address: 'https://finehomebuilding.com/forum/how-long-to-install-cabinets',
  },
  T03: {
    says: '1.25 hours a unit; 25 to 35 hours of labour for an average kitchen.',
    address:
      'https://ventolaphotography.com/how-many-man-hours-does-it-take-to-install-kitchen-cabinets/',
  },
  T08: {
    says: '14 units in three days; stripping out half a day.',
    address: 'https://olivestone.co.uk/how-long-does-it-take-to-fit-a-kitchen/',
  },
  T13: {
    says: 'A template visit takes 1 to 3 hours, by layout.',
    address: 'https://engineerfix.com/how-long-does-it-take-to-fabricate-quartz-countertops',
  },
  T19: {
    says: 'A delivery driver gives about 15 minutes for checking.',
    address: 'https://www.cabinetjoint.com/receiving-delivery/',
  },
  M30: {
    says: 'A full first visit takes 90 to 120 minutes; a check measure booked for an hour took 15 minutes.',
    address:
      'https://webster-kitchen-and-bath-pi3.pages.dev/blog/how-mike-quotes-kitchen-remodels/',
  },
} as const satisfies Record<string, { says: string; address: string }>;
