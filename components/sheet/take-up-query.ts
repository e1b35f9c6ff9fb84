import { askServer } from '@/components/shell/ask-server';
import { apiPaths } from '@/lib/paths';

/** The bench takes a revision up. */
export function sendTakeUp(releaseId: string): Promise<{ releaseId: string }> {
  return askServer(apiPaths.takeUpSheet(releaseId), { method: 'POST' });
}
