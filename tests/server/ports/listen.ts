import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';

export type Post = {
  path: string;
  params: Record<string, string>;
  headers: Record<string, string>;
};

/** A web server that notes the forms posted to it, as our webhook would receive them. */
export async function listen() {
  const posts: Post[] = [];
  const server = createServer(async (request, response) => {
    const chunks: Buffer[] = [];
    for await (const chunk of request) chunks.push(chunk as Buffer);
    const params = Object.fromEntries(new URLSearchParams(Buffer.concat(chunks).toString()));
    const headers = Object.fromEntries(
      Object.entries(request.headers).map(([name, value]) => [name, String(value)]),
    );
    posts.push({ path: request.url ?? '', params, headers });
    response.writeHead(204).end();
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  return {
    url,
    posts,
    stop: () => new Promise<void>((resolve) => server.close(() => resolve())),
  };
}
