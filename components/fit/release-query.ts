import { askServer } from '@/components/shell/ask-server';
import type { ReleaseSheetInput } from '@/lib/contracts/rooms';
import { apiPaths } from '@/lib/paths';

/** Freezes the fit that was seen as the next revision. */
export function sendRelease(input: ReleaseSheetInput): Promise<{ revision: string }> {
  return askServer(apiPaths.sheets(), { body: input });
}
