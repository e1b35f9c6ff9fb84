import { and, eq } from 'drizzle-orm';
import { files } from '@/db/schema';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import type { FileAnswer } from '@/server/base/handle-file';
import { notFound } from '@/server/base/problem-response';
import { filesPort } from '@/server/ports/files/choose-files';

/** One file, for the shop's own people. */
export async function getFile(
  ctx: PersonContext,
  { fileId }: { fileId: string },
): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'walls:read');
  const [file] = await ctx.db
    .select({
      name: files.name,
      mediaType: files.mediaType,
      bytes: files.bytes,
      sha256: files.sha256,
      storageKey: files.storageKey,
    })
    .from(files)
    .where(and(eq(files.shopId, ctx.shop.id), eq(files.id, fileId)));
  if (!file) throw notFound('file');
  const { name, mediaType, bytes, sha256, storageKey } = file;
  return {
    name,
    mediaType,
    bytes,
    mark: sha256,
    open: async () => {
      const port = await filesPort();
      const stream = await port.read(storageKey);
      // The row is there and the bytes are not: a folder that was not restored with the database.
      if (!stream) throw notFound('file');
      return stream;
    },
  };
}
