import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/database';
import { readings, releaseReceipts, releases, rooms, runs, units, walls } from '@/db/schema';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import { fitRoom } from '@/lib/measure/fit-room';
import type { DemoJob } from './demo-jobs';
import { type PlannedRoom, planRoom, type RoomPlan } from './demo-rooms';
import { measureRoom } from './measure-room';
import type { SeedShop } from './seed-demo';
import type { StoryLine } from './seed-story';
import type { StaffKey } from './staff';
import { workday, workdayAfter } from './workday';

/** A room drawn, measured to the last reading, and released where the job has come that far. */
export async function seedRoom(
  tx: Transaction,
  shop: SeedShop,
  { jobId, job, plan }: { jobId: string; job: DemoJob; plan: RoomPlan },
): Promise<StoryLine[]> {
  const planned = planRoom(plan, shop.rules.fit, shop.random);
  const measuredAt = workday(shop, Math.min(-1, job.visits?.[0]?.day ?? -1), '09:20');
  const taken = measureRoom({
    ...planned,
    rules: shop.rules.fit,
    tools: shop.tools,
    random: shop.random,
    startedAt: measuredAt,
  });
  const measurer = job.visits?.[0]?.crew === 'tor' ? 'tor' : 'measurer';
  const takenBy = shop.staff[measurer];
  await writeRoom(tx, shop, { jobId, planned, measuredAt });
  await writeReadings(tx, shop, taken, takenBy);
  await writeRuns(tx, shop, planned);
  const handedIn: StoryLine = {
    at: new Date(measuredAt.getTime() + 3_600_000),
    by: measurer,
    verb: 'submit-room',
    subjectKind: 'room',
    subjectId: planned.room.id,
    summary: `Handed in the wall book of ${planned.room.name}`,
  };
  if (job.stage === 'measured') return [handedIn];
  const book = { room: planned.room, readings: taken, tools: Object.values(shop.tools) };
  const isTakenUp = job.stage !== 'released';
  return [handedIn, ...(await release(tx, shop, { planned, book, measurer, isTakenUp }))];
}

async function writeRoom(
  tx: Transaction,
  { id: shopId }: SeedShop,
  { jobId, planned, measuredAt }: { jobId: string; planned: PlannedRoom; measuredAt: Date },
) {
  const { room } = planned;
  await tx.insert(rooms).values({
    id: room.id,
    shopId,
    jobId,
    name: room.name,
    submittedAt: new Date(measuredAt.getTime() + 3_600_000),
  });
  await tx.insert(walls).values(
    room.chains.flatMap((chain, chainIndex) =>
      chain.walls.map((wall, position) => ({
        shopId,
        roomId: room.id,
        chain: chainIndex,
        chainClosed: chain.closed,
        position,
        ...wall,
      })),
    ),
  );
}

async function writeReadings(
  tx: Transaction,
  { id: shopId }: SeedShop,
  taken: Reading[],
  takenBy: string,
) {
  if (taken.length === 0) return;
  await tx.insert(readings).values(
    taken.map((body) => ({
      id: body.id,
      shopId,
      roomId: body.roomId,
      kind: body.kind,
      body,
      takenAt: new Date(body.takenAt),
      receivedAt: new Date(body.takenAt),
      takenBy,
    })),
  );
}

async function writeRuns(
  tx: Transaction,
  { id: shopId }: SeedShop,
  { room, runs: all }: PlannedRoom,
) {
  for (const [position, { id, wallId, name, units: boxes, ...body }] of all.entries()) {
    await tx.insert(runs).values({ id, shopId, roomId: room.id, wallId, position, name, body });
    if (boxes.length === 0) continue;
    await tx
      .insert(units)
      .values(boxes.map((box, place) => ({ shopId, runId: id, position: place, ...box })));
  }
}

async function release(
  tx: Transaction,
  shop: SeedShop,
  made: { planned: PlannedRoom; book: WallBook; measurer: StaffKey; isTakenUp: boolean },
): Promise<StoryLine[]> {
  const { planned, book, measurer, isTakenUp } = made;
  const rules = shop.rules.fit;
  const fit = fitRoom(book, planned.runs, rules);
  const id = randomUUID();
  const last = book.readings.at(-1);
  const releasedAt = new Date(last ? Date.parse(last.takenAt) + 7_200_000 : shop.now.getTime());
  await tx.insert(releases).values({
    id,
    shopId: shop.id,
    roomId: planned.room.id,
    revision: 'A',
    engineVersion: fit.engineVersion,
    readingIds: fit.readingIds,
    wallBook: book,
    runs: planned.runs,
    rules,
    fit,
    changes: [],
    releasedAt,
    releasedBy: shop.staff[measurer],
  });
  const line = (at: Date, by: StaffKey, verb: string, summary: string): StoryLine => ({
    at,
    by,
    verb,
    subjectKind: 'release',
    subjectId: id,
    summary,
  });
  const { name } = planned.room;
  const released = line(releasedAt, measurer, 'release-sheet', `Released ${name}, revision A`);
  if (!isTakenUp) return [released];
  const takenUpAt = workdayAfter(shop, releasedAt);
  await tx.insert(releaseReceipts).values({
    shopId: shop.id,
    releaseId: id,
    takenUpAt,
    takenUpBy: shop.staff.bench,
  });
  return [
    released,
    line(takenUpAt, 'bench', 'take-up-sheet', `The bench took up ${name}, revision A`),
  ];
}
