import { inStore } from './phone-database';

/** What was half done under a name; null when there is nothing. The caller knows its own shape. */
export async function readDraft<Draft>(key: string): Promise<Draft | null> {
  const kept = await inStore(({ drafts }) => drafts.get(key));
  return (kept?.value as Draft | undefined) ?? null;
}

/** Each key tapped is kept; nobody waits for it. */
export function keepDraft(key: string, value: unknown): void {
  inStore(({ drafts }) => drafts.put({ key, value })).catch(reportLost);
}

export function dropDraft(key: string): void {
  inStore(({ drafts }) => drafts.delete(key)).catch(reportLost);
}

/** A draft is a convenience: what was accepted stands in the queue, and only that may stop the measurer. */
function reportLost(cause: unknown): void {
  console.warn('setwell: a draft was not kept', cause);
}
