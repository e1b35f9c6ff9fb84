import { createHash } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { files } from '@/db/schema';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { filesPort } from '@/server/ports/files/choose-files';

type FileRow = typeof files.$inferInsert;
type KeptFile = Pick<FileRow, 'jobId' | 'name' | 'mediaType' | 'takenAt'> &
  Partial<Pick<FileRow, 'roomId' | 'wallId' | 'caption' | 'widthPx' | 'heightPx'>> & {
    id: string;
    ending: 'jpg' | 'pdf';
  };

/**
 * Keeps bytes under the id that the sender gave them: sent twice they are kept once, and another file's id is refused.
 * The bytes are safe before the row says that they are there.
 */
export async function keepFile(
  ctx: PersonContext,
  bytes: Uint8Array,
  { ending, ...file }: KeptFile,
  story: Omit<Parameters<typeof writeAudit>[2], 'jobId'>,
): Promise<{ fileId: string }> {
  const shopId = ctx.shop.id;
  const { id: fileId, jobId } = file;
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const storageKey = `${shopId}/${fileId}-${sha256.slice(0, 16)}.${ending}`;
  const port = await filesPort();
  await port.put(storageKey, bytes);
  return ctx.db.transaction(async (tx) => {
    const [added] = await tx
      .insert(files)
      .values({
        ...file,
        shopId,
        bytes: bytes.length,
        sha256,
        storageKey,
        addedBy: ctx.actor.personId,
      })
      .onConflictDoNothing({ target: files.id })
      .returning({ id: files.id });
    if (added) {
      await writeAudit(tx, ctx, { ...story, jobId });
      return { fileId };
    }
    const [kept] = await tx
      .select({ sha256: files.sha256 })
      .from(files)
      .where(and(eq(files.shopId, shopId), eq(files.id, fileId), eq(files.jobId, jobId)));
    if (kept?.sha256 !== sha256) throw idTaken();
    return { fileId };
  });
}

function idTaken(): Refusal {
  return new Refusal({
    status: 409,
    code: 'id-taken',
    message: 'Another file has this id already. It was not changed; add this one again.',
  });
}
