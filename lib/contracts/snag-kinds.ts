/** What a snag is and who mends it; without a schema, so that a phone's first page need not load one. */

/** fault: not right as it is set. The others are parts: short, damaged, or not the right one. */
export const snagKinds = ['fault', 'short', 'damaged', 'wrong-part'] as const;
export type SnagKind = (typeof snagKinds)[number];

export const snagMenders = ['crew', 'bench', 'supplier', 'other-trade', 'customer'] as const;
export type SnagMender = (typeof snagMenders)[number];
