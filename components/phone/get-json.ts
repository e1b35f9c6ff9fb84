/** A van in a dead spot: give up and try later. */
const PATIENCE_MS = 30_000;

/** One question to the office; null when it does not answer, or not with what was asked for. */
export async function getJson<Answer>(
  path: string,
  method: 'GET' | 'POST' = 'GET',
): Promise<Answer | null> {
  try {
    const response = await fetch(path, {
      method,
      headers: { accept: 'application/json' },
      redirect: 'manual',
      signal: AbortSignal.timeout(PATIENCE_MS),
    });
    const isJson = /\bjson\b/.test(response.headers.get('content-type') ?? '');
    return response.ok && isJson ? ((await response.json()) as Answer) : null;
  } catch {
    return null;
  }
}
