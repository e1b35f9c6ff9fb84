import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { RouteHandler } from '@/server/base/handle';

/**
 * Our own address on loopback, where the fake provider posts to: each path to its route. While it stands,
 * the program gives it out as its public one.
 */
export async function openWebhookDoor(routes: Record<string, RouteHandler>) {
  const before = process.env.PUBLIC_URL;
  const server = createServer(async (incoming, outgoing) => {
    const chunks: Buffer[] = [];
    for await (const chunk of incoming) chunks.push(chunk as Buffer);
    const url = new URL(incoming.url ?? '/', process.env.PUBLIC_URL);
    const route = routes[url.pathname];
    const answer = route
      ? await route(
          new Request(url, {
            method: 'POST',
            headers: incoming.headers as Record<string, string>,
            body: Buffer.concat(chunks),
          }),
        )
      : new Response(null, { status: 404 });
    outgoing.writeHead(answer.status).end(await answer.text());
  });
  await new Promise<void>((resolve) => {
    server.listen(0, '127.0.0.1', resolve);
  });
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  process.env.PUBLIC_URL = url;
  return {
    url,
    async close() {
      process.env.PUBLIC_URL = before;
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}
