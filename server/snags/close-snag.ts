import type { CloseSnagInput } from '@/lib/contracts/snags';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { writeClosing } from './write-closing';

/** Closed from the office, with a word or a photo that shows it. */
export async function closeSnag(
  ctx: PersonContext,
  input: CloseSnagInput,
): Promise<{ snagId: string }> {
  mustBeAllowed(ctx, 'snags:change');
  await ctx.db.transaction((tx) => writeClosing(tx, ctx, { ...input, at: ctx.now }));
  return { snagId: input.snagId };
}
