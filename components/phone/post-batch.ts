import type { Batch } from '@/lib/sync/next-batch';
import type { Answer } from '@/lib/sync/settle-batch';

/** A van in a dead spot: give up and try later. */
const PATIENCE_MS = 30_000;

/** One request to the office. Only JSON counts as its answer; a redirect is somebody else's. */
export async function postBatch({ path, body }: Batch): Promise<Answer> {
  try {
    const response = await fetch(path, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
      redirect: 'manual',
      signal: AbortSignal.timeout(PATIENCE_MS),
    });
    if (response.type === 'opaqueredirect') return 'no-answer';
    const isJson = /\bjson\b/.test(response.headers.get('content-type') ?? '');
    return { status: response.status, json: isJson ? await response.json() : null };
  } catch {
    return 'no-answer';
  }
}
