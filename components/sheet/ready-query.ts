import { askServer } from '@/components/shell/ask-server';
import { apiPaths } from '@/lib/paths';

/** The bench says on which day the cabinets are ready; null takes it back. */
export function sendReady(jobId: string, readyOn: string | null): Promise<unknown> {
  return askServer(apiPaths.jobReady(jobId), { body: { readyOn } });
}
