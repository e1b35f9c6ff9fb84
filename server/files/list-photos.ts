import { and, asc, eq } from 'drizzle-orm';
import { files, jobs, people, rooms } from '@/db/schema';
import type { ListPhotosInput, PhotoRow } from '@/lib/contracts/files';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** The photos of a room, or of all rooms of a job, in the order in which they were taken. */
export async function listPhotos(ctx: PersonContext, input: ListPhotosInput): Promise<PhotoRow[]> {
  mustBeAllowed(ctx, 'walls:read');
  const ofInput = await within(ctx, input);
  const rows = await ctx.db
    .select({
      id: files.id,
      roomId: files.roomId,
      wallId: files.wallId,
      caption: files.caption,
      widthPx: files.widthPx,
      heightPx: files.heightPx,
      takenAt: files.takenAt,
      takenBy: people.name,
    })
    .from(files)
    .innerJoin(people, eq(people.id, files.addedBy))
    .where(and(eq(files.shopId, ctx.shop.id), ofInput))
    .orderBy(asc(files.takenAt), asc(files.id));
  return rows.flatMap(({ roomId, widthPx, heightPx, takenAt, ...row }) =>
    roomId === null || widthPx === null || heightPx === null
      ? []
      : [{ ...row, roomId, widthPx, heightPx, takenAt: takenAt.toISOString() }],
  );
}

/** The condition for what was named, once it is known to be this shop's. */
async function within(ctx: PersonContext, { roomId, jobId = '' }: ListPhotosInput) {
  if (roomId !== undefined) {
    const [room] = await ctx.db
      .select({ id: rooms.id })
      .from(rooms)
      .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, roomId)));
    if (!room) throw notFound('room');
    return eq(files.roomId, roomId);
  }
  const [job] = await ctx.db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
  return eq(files.jobId, jobId);
}
