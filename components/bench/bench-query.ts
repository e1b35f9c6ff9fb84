import { askServer } from '@/components/shell/ask-server';
import { apiPaths } from '@/lib/paths';

/** The bench says on which day the cabinets are ready, where they stand or why not; null takes it back. */
export function sendReady(
  jobId: string,
  said: { readyOn: string | null; where?: string; why?: string },
): Promise<unknown> {
  return askServer(apiPaths.jobReady(jobId), { body: said });
}

/** What the bench does about a note from site. */
export function sendAnswer(
  snagId: string,
  answer: { words: string; readyOn: string | null },
): Promise<unknown> {
  return askServer(apiPaths.answerSnag(snagId), { body: answer });
}
