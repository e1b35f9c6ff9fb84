import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, people, readings, rooms, sites, tools } from '@/db/schema';
import type { Reader } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readChains } from './read-chains';
import { readRuns } from './read-runs';

/** A room's book with what stands around it, as the database has it now. */
export type BookOnFile = {
  jobId: string;
  jobNumber: number;
  jobTitle: string;
  customerName: string;
  street: string;
  yearBuilt: number | null;
  submittedAt: Date | null;
  wallBook: WallBook;
  runs: Run[];
  /** Who took each reading: reading id → name. */
  takenBy: Map<string, string>;
  /** The same by person, in the order in which they first read something. */
  readers: Reader[];
};

/** Reads the whole book of one room of this shop; inside a transaction where it is given one. */
export async function readWallBook(
  db: Database,
  ctx: PersonContext,
  roomId: string,
): Promise<BookOnFile> {
  const [found] = await db
    .select({
      jobId: jobs.id,
      jobNumber: jobs.number,
      jobTitle: jobs.title,
      customerName: customers.name,
      street: sites.street,
      yearBuilt: sites.yearBuilt,
      name: rooms.name,
      wallThicknessToComeMm: rooms.wallThicknessToComeMm,
      floorToComeMm: rooms.floorToComeMm,
      cabinetsStandOn: rooms.cabinetsStandOn,
      submittedAt: rooms.submittedAt,
    })
    .from(rooms)
    .innerJoin(jobs, eq(jobs.id, rooms.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, roomId)));
  if (!found) throw notFound('room');
  const { name, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn, ...around } = found;
  const chains = (await readChains(db, ctx, [roomId])).get(roomId) ?? [];
  const lines = await readLines(db, ctx, roomId);
  return {
    ...around,
    wallBook: {
      room: {
        id: roomId,
        name,
        chains,
        wallThicknessToComeMm,
        floorToComeMm,
        ...(cabinetsStandOn ? { cabinetsStandOn } : {}),
      },
      readings: lines.map(({ body }) => body),
      tools: await readTools(db, ctx),
    },
    runs: (await readRuns(db, ctx, [roomId])).get(roomId) ?? [],
    takenBy: new Map(lines.map(({ body, takenBy }) => [body.id, takenBy])),
    readers: readersOf(lines),
  };
}

/** In the order in which the office got them. */
function readLines(db: Database, ctx: PersonContext, roomId: string) {
  return db
    .select({ body: readings.body, personId: people.id, takenBy: people.name })
    .from(readings)
    .innerJoin(people, eq(people.id, readings.takenBy))
    .where(and(eq(readings.shopId, ctx.shop.id), eq(readings.roomId, roomId)))
    .orderBy(asc(readings.sequence));
}

function readersOf(lines: Awaited<ReturnType<typeof readLines>>): Reader[] {
  const readers = new Map<string, Reader>();
  for (const { body, personId, takenBy } of lines) {
    const reader = readers.get(personId) ?? { personId, name: takenBy, readingIds: [] };
    reader.readingIds.push(body.id);
    readers.set(personId, reader);
  }
  return [...readers.values()];
}

function readTools(db: Database, ctx: PersonContext) {
  return db
    .select({ id: tools.id, name: tools.name, spec: tools.spec })
    .from(tools)
    .where(eq(tools.shopId, ctx.shop.id))
    .orderBy(asc(tools.createdAt), asc(tools.name), asc(tools.id));
}
