import { askServer } from '@/components/shell/ask-server';
import type { SnagMender } from '@/lib/contracts/snag-kinds';
import type { OpenSnagInput } from '@/lib/contracts/snags';
import { apiPaths } from '@/lib/paths';

/** A snag that the office heard of. */
export function sendSnag(snag: OpenSnagInput): Promise<unknown> {
  return askServer(apiPaths.snags(), { body: snag });
}

/** Who mends it, and by when. */
export function sendSnagChange(
  snagId: string,
  change: { mender?: SnagMender; dueOn?: string | null },
): Promise<unknown> {
  return askServer(apiPaths.snag(snagId), { method: 'PATCH', body: change });
}

export function sendSnagClosing(snagId: string, words: string): Promise<unknown> {
  return askServer(apiPaths.closeSnag(snagId), { body: { words } });
}
