/** Asks a running program as a signed-in person's browser would; gives the status and what was answered. */
export async function askAt<Answer = unknown>(
  at: { baseUrl: string; cookie: string },
  path: string,
  ask: { method?: string; body?: unknown; headers?: Record<string, string> } = {},
): Promise<{ status: number; body: Answer }> {
  const response = await fetch(at.baseUrl + path, {
    method: ask.method ?? (ask.body === undefined ? 'GET' : 'POST'),
    headers: {
      origin: at.baseUrl,
      cookie: at.cookie,
      ...(ask.body === undefined ? {} : { 'content-type': 'application/json' }),
      ...ask.headers,
    },
    body: ask.body === undefined ? undefined : JSON.stringify(ask.body),
  });
  const text = await response.text();
  return { status: response.status, body: (text ? JSON.parse(text) : null) as Answer };
}

/** The same, for what must succeed. */
export async function getAt<Answer>(
  at: { baseUrl: string; cookie: string },
  path: string,
  ask: { method?: string; body?: unknown } = {},
): Promise<Answer> {
  const { status, body } = await askAt<Answer>(at, path, ask);
  if (status !== 200) throw new Error(`${path}: ${status} ${JSON.stringify(body)}`);
  return body;
}
