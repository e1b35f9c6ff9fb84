import { paths } from '@/lib/paths';

/** What the fit page shows beside the plan: a wall, and perhaps a run being laid out on it. */
export type FitChoice = { wall?: string; lay?: string };

/** The fit page with something chosen; `lay` is a run's id, or "new". */
export function fitHref(jobId: string, roomId: string, choice: FitChoice = {}): string {
  const query = new URLSearchParams(
    Object.entries(choice).filter((entry): entry is [string, string] => Boolean(entry[1])),
  ).toString();
  return query ? `${paths.room(jobId, roomId)}?${query}` : paths.room(jobId, roomId);
}
