/** A reading to take, with everything the phone must know to offer it as a one-question screen. */

/** The fixed fields of the reading asked for; what is left out is what the measurer reads. */
export type AskedReading =
  | { kind: 'length'; wallId: string; zMm: number; yMm: number; nominalMm: number }
  | {
      kind: 'pieces';
      wallId: string;
      zMm: number;
      nominalMm: number;
      /** What each piece is called, left to right, at least two: "piece to the window", "window". */
      stretches: string[];
    }
  | {
      kind: 'corner';
      cornerWallId: string;
      zMm: number;
      nominalDeg: number;
      /** Leg to mark off, as long as the walls allow; the phone fills both legs with it. */
      legMm: number;
      /** Outside corner: lay the left leg on a straightedge carried past the corner. */
      carriedPast: boolean;
    }
  | {
      kind: 'face';
      wallId: string;
      xMm: number;
      zMm: number;
      setUpKind: 'straightedge' | 'plumb-level' | 'laser-plane';
      /** Readings of one group belong to one set-up: "face:<wallId>". */
      setUpGroup: string;
      /** The set-up already begun for this group; null: the phone begins one. */
      setUpId: string | null;
    }
  | {
      kind: 'floor' | 'ceiling';
      wallId: string;
      xMm: number;
      yMm: number;
      setUpGroup: string;
      setUpId: string | null;
    }
  | { kind: 'diagonal'; fromCornerWallId: string; toCornerWallId: string; zMm: number }
  | { kind: 'width'; wallId: string; xMm: number; toWallId: string; zMm: number }
  | { kind: 'stud'; wallId: string; nth: number }
  | { kind: 'feature'; wallId: string; feature: 'water' | 'waste' }
  | { kind: 'doorway' };

export type PlannedReading = {
  /** Stable key; a `skip` reading names it: "length:<wallId>:910". */
  slot: string;
  /** "Wall B, length at the counter". */
  words: string;
  /** Why it is needed: "Sets the room for run Sink wall at counter height." */
  why: string;
  /** must: a cut size hangs on it; should: it makes a figure surer or checks another. */
  need: 'must' | 'should';
  ask: AskedReading;
  /** Readings that answer it; empty while it is open. */
  takenBy: string[];
  /** Asked for, not taken, with the reason given; null where nobody said so. */
  skipped: { readingId: string; reason: string } | null;
};

/** Still open. One that was skipped stays here, with its reason. */
export type MissingReading = PlannedReading;
