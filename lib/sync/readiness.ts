/** What the phone holds for a day without a signal. */
export type KeptHere = {
  /** The worker has the program itself. */
  isProgramKept: boolean;
  /** The last time the day was fetched whole; null: never. */
  fetchedAt: string | null;
  visitCount: number;
  /** Of these, kept with what is done there; left out for who does not report from site. */
  keptStopCount?: number;
  /** Of the day's visits. */
  roomIds: readonly string[];
  /** Of these, kept with their wall books. */
  keptRoomIds: ReadonlySet<string>;
};

export type Readiness = { isReady: boolean; lines: { words: string; isKept: boolean }[] };

/**
 * Whether the day can go on without a signal, and line by line what of it is on the phone.
 *
 * Edge: a day without visits is ready once it was fetched.
 * Example: 3 visits, 2 rooms, one of them not fetched: not ready, "Wall books: 1 of 2".
 */
export function readinessOf(kept: KeptHere): Readiness {
  const { isProgramKept, fetchedAt, visitCount, roomIds, keptRoomIds } = kept;
  const stops = kept.keptStopCount ?? visitCount;
  const books = roomIds.filter((id) => keptRoomIds.has(id)).length;
  const lines = [
    { words: isProgramKept ? 'The program' : 'The program: not yet', isKept: isProgramKept },
    {
      words: fetchedAt === null ? 'Visits: not yet' : `Visits: ${ofAll(stops, visitCount)}`,
      isKept: fetchedAt !== null && stops === visitCount,
    },
    {
      words:
        roomIds.length === 0
          ? 'Wall books: no room is drawn yet'
          : `Wall books: ${books} of ${roomIds.length}`,
      isKept: fetchedAt !== null && books === roomIds.length,
    },
  ];
  return { isReady: lines.every(({ isKept }) => isKept), lines };
}

const ofAll = (count: number, all: number) => (count === all ? `${all}` : `${count} of ${all}`);
