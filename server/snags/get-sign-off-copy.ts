import { createHash } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { signOffs } from '@/db/schema';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import type { FileAnswer } from '@/server/base/handle-file';
import { notFound } from '@/server/base/problem-response';
import { makeCopy } from './make-copy';

/** What the customer signed, for the shop's own people. */
export async function getSignOffCopy(
  ctx: PersonContext,
  { signOffId }: { signOffId: string },
): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'jobs:read');
  const copy = await makeCopy(ctx, eq(signOffs.id, signOffId));
  if (!copy) throw notFound('sign-off');
  const bytes = Buffer.from(copy.bytes);
  return {
    name: copy.fileName,
    mediaType: 'application/pdf',
    bytes: bytes.length,
    mark: createHash('sha256').update(bytes).digest('hex'),
    open: async () => new Blob([bytes]).stream(),
  };
}
