import { and, desc, eq, isNull } from 'drizzle-orm';
import { files, people } from '@/db/schema';
import type { JobFileRow } from '@/lib/contracts/papers';
import { formatDayShort } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** What is kept with the job itself and with no room: papers, and photos from before a room was drawn. */
export async function listJobFiles(
  ctx: PersonContext,
  { jobId }: { jobId: string },
): Promise<JobFileRow[]> {
  mustBeAllowed(ctx, 'walls:read');
  const rows = await ctx.db
    .select({
      id: files.id,
      name: files.name,
      caption: files.caption,
      mediaType: files.mediaType,
      bytes: files.bytes,
      addedBy: people.name,
      createdAt: files.createdAt,
    })
    .from(files)
    .innerJoin(people, eq(people.id, files.addedBy))
    .where(and(eq(files.shopId, ctx.shop.id), eq(files.jobId, jobId), isNull(files.roomId)))
    .orderBy(desc(files.createdAt));
  const { zone, region } = ctx.shop;
  return rows.map(({ mediaType, bytes, createdAt, ...row }) => ({
    ...row,
    isPicture: mediaType === 'image/jpeg',
    kilobytes: Math.max(1, Math.round(bytes / 1_000)),
    addedAtWords: formatDayShort(createdAt, zone, { language: 'en', region }),
  }));
}
