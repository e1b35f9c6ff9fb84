/** One GET to somebody else's service, with an end to the waiting and to the reading. */

export type AskFailure = {
  /** unreachable: nobody there; no-answer: not in time, or no JSON; busy: 429 or 503; refused: any other status. */
  reason: 'unreachable' | 'no-answer' | 'busy' | 'refused';
  status: number | null;
  /** What a refusal said, as far as it was JSON. */
  body: unknown;
};
export type AskAnswer = { ok: true; body: unknown } | ({ ok: false } & AskFailure);

const mostBytes = 4_000_000;

export async function askJson(
  url: URL,
  { timeoutMs, userAgent }: { timeoutMs: number; userAgent: string },
): Promise<AskAnswer> {
  const failed = (
    reason: AskFailure['reason'],
    status: number | null = null,
    body: unknown = null,
  ) => ({ ok: false, reason, status, body }) as const;
  try {
    const response = await fetch(url, {
      headers: { accept: 'application/json', 'user-agent': userAgent },
      // Where a service is configured it answers itself; it cannot send this server elsewhere.
      redirect: 'error',
      signal: AbortSignal.timeout(timeoutMs),
    });
    const body = parse(await readText(response));
    if (response.ok) return body === undefined ? failed('no-answer') : { ok: true, body };
    const isBusy = response.status === 429 || response.status === 503;
    return failed(isBusy ? 'busy' : 'refused', response.status, body ?? null);
  } catch (error) {
    const isLate = error instanceof DOMException && error.name === 'TimeoutError';
    return failed(isLate ? 'no-answer' : 'unreachable');
  }
}

async function readText(response: Response): Promise<string> {
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  for await (const chunk of response.body ?? []) {
    bytes += chunk.byteLength;
    if (bytes > mostBytes) return '';
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString('utf8');
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
