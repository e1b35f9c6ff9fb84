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
  language?: 'en' | 'es';
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
  const say = words[kept.language ?? 'en'];
  const stops = kept.keptStopCount ?? visitCount;
  const books = roomIds.filter((id) => keptRoomIds.has(id)).length;
  const lines = [
    { words: isProgramKept ? say.program : say.notYet(say.program), isKept: isProgramKept },
    {
      words:
        fetchedAt === null
          ? say.notYet(say.visits)
          : `${say.visits}: ${stops === visitCount ? visitCount : say.of(stops, visitCount)}`,
      isKept: fetchedAt !== null && stops === visitCount,
    },
    {
      words: `${say.books}: ${roomIds.length === 0 ? say.noRoom : say.of(books, roomIds.length)}`,
      isKept: fetchedAt !== null && books === roomIds.length,
    },
  ];
  return { isReady: lines.every(({ isKept }) => isKept), lines };
}

const words = {
  en: {
    program: 'The program',
    visits: 'Visits',
    books: 'Wall books',
    noRoom: 'no room is drawn yet',
    notYet: (what: string) => `${what}: not yet`,
    of: (count: number, all: number) => `${count} of ${all}`,
  },
  es: {
    program: 'El programa',
    visits: 'Visitas',
    books: 'Libros de medidas',
    noRoom: 'aún no hay cuartos dibujados',
    notYet: (what: string) => `${what}: aún no`,
    of: (count: number, all: number) => `${count} de ${all}`,
  },
};
