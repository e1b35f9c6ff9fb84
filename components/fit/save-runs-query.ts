import { askServer } from '@/components/shell/ask-server';
import type { SaveRunsInput } from '@/lib/contracts/rooms';
import { apiPaths } from '@/lib/paths';

/** Puts the runs of a room in place of those it has; the page is then read anew by its own server part. */
export function sendRuns({ roomId, ...body }: SaveRunsInput): Promise<{ runsMark: string }> {
  return askServer(apiPaths.runs(roomId), { body });
}
