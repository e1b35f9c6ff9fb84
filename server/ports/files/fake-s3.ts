/** A store on loopback that speaks what the S3 SDK needs of the protocol; it forgets all when it stops. */
import { createServer } from 'node:http';
import { LOOPBACK, listenOnLoopback, trackSockets } from '@/server/ports/fakes/listening';

export type FakeS3 = Awaited<ReturnType<typeof startFakeS3>>;

export async function startFakeS3() {
  const kept = new Map<string, Buffer>();
  let refusals = 0;
  const server = createServer((request, response) => {
    const key = decodeURIComponent(new URL(request.url ?? '/', 'http://fake.example').pathname);
    const chunks: Buffer[] = [];
    request.on('data', (chunk: Buffer) => chunks.push(chunk));
    request.on('end', () => {
      if (refusals > 0) {
        refusals -= 1;
        return answer(503, '<Error><Code>SlowDown</Code></Error>');
      }
      if (!request.headers.authorization?.startsWith('AWS4-HMAC-SHA256 ')) {
        return answer(403, '<Error><Code>AccessDenied</Code></Error>');
      }
      if (request.method === 'PUT') {
        kept.set(key, unwrapped(Buffer.concat(chunks), request.headers));
        return answer(200, '');
      }
      if (request.method === 'DELETE') {
        kept.delete(key);
        return answer(204, '');
      }
      const bytes = kept.get(key);
      return bytes ? answer(200, bytes) : answer(404, '<Error><Code>NoSuchKey</Code></Error>');
    });
    const answer = (status: number, body: string | Buffer) => {
      const type = typeof body === 'string' ? 'application/xml' : 'application/octet-stream';
      response.writeHead(status, { 'content-type': type, etag: '"fake"' }).end(body);
    };
  });
  const sockets = trackSockets(server);
  const baseUrl = `http://${LOOPBACK}:${await listenOnLoopback(server, 0)}`;
  return {
    baseUrl,
    keys: (): string[] => [...kept.keys()],
    /** The next so many requests are told to come back later. */
    refuseNext: (count: number) => {
      refusals = count;
    },
    async stop(): Promise<void> {
      sockets.dropAll();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}

/** The SDK may send a body in chunks, each with its length before it and a checksum at the end. */
function unwrapped(body: Buffer, headers: NodeJS.Dict<string | string[]>): Buffer {
  if (!String(headers['content-encoding'] ?? '').includes('aws-chunked')) return body;
  const parts: Buffer[] = [];
  for (let at = 0; ; ) {
    const lineEnd = body.indexOf('\r\n', at);
    const length = Number.parseInt(body.subarray(at, lineEnd).toString(), 16);
    if (!length) return Buffer.concat(parts);
    parts.push(body.subarray(lineEnd + 2, lineEnd + 2 + length));
    at = lineEnd + 2 + length + 2;
  }
}
