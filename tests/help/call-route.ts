import type { RouteHandler } from '@/server/base/handle';

/** Calls a route as a browser of ours would: with the cookie, from our own origin. */
export async function callRoute(
  route: RouteHandler,
  call: {
    method?: 'GET' | 'POST' | 'PATCH' | 'DELETE';
    url?: string;
    body?: unknown;
    params?: Record<string, string>;
    cookie?: string;
    headers?: Record<string, string>;
  },
): Promise<{ status: number; body: unknown; headers: Headers }> {
  const method = call.method ?? 'POST';
  const request = new Request(`http://localhost:3000${call.url ?? '/api/test'}`, {
    method,
    headers: {
      origin: 'http://localhost:3000',
      'content-type': 'application/json',
      ...(call.cookie ? { cookie: call.cookie } : {}),
      ...call.headers,
    },
    body: method === 'GET' ? undefined : JSON.stringify(call.body ?? {}),
  });
  const response = await route(request, { params: Promise.resolve(call.params ?? {}) });
  const text = await response.text();
  return {
    status: response.status,
    body: text ? JSON.parse(text) : null,
    headers: response.headers,
  };
}
