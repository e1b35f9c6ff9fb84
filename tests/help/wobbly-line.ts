import http from 'node:http';
import { afterAll } from 'vitest';
import { freePort } from './free-port';

/**
 * through: as it is. gone: nothing passes, for pages and workers alike. silent: takes requests and never
 * answers. loses-answers: the office hears, the phone does not.
 */
export type LineState = 'through' | 'gone' | 'silent' | 'loses-answers';

export type WobblyLine = {
  baseUrl: string;
  set: (state: LineState) => void;
  /** From here on the worker's script is another one, as after a new build. */
  offerNewWorker: () => void;
};

/** A line between a phone and the program that can be bad in ways that "offline" is not. */
export async function openWobblyLine(programUrl: string): Promise<WobblyLine> {
  let state: LineState = 'through';
  let tail = '';
  const { hostname, port } = new URL(programUrl);
  const server = http.createServer((request, response) => {
    if (state === 'silent') return;
    if (state === 'gone') {
      request.socket.destroy();
      return;
    }
    const onward = http.request(
      { hostname, port, path: request.url, method: request.method, headers: request.headers },
      (answer) => {
        if (state === 'loses-answers' && request.method === 'POST') {
          answer.resume();
          answer.once('end', () => response.destroy());
          return;
        }
        const isWorker = request.url === '/serwist/sw.js' && tail !== '';
        const headers = { ...answer.headers };
        if (isWorker) delete headers['content-length'];
        response.writeHead(answer.statusCode ?? 502, headers);
        answer.on('data', (part) => response.write(part));
        answer.on('end', () => response.end(isWorker ? tail : undefined));
      },
    );
    onward.on('error', () => response.destroy());
    if (tail !== '') {
      onward.setHeader('accept-encoding', 'identity');
      // "Not changed" would be said of the worker as it was.
      onward.removeHeader('if-none-match');
      onward.removeHeader('if-modified-since');
    }
    request.pipe(onward);
  });
  const own = await freePort();
  await new Promise<void>((resolve) => server.listen(own, 'localhost', resolve));
  afterAll(() => {
    server.closeAllConnections();
    server.close();
  });
  return {
    baseUrl: `http://localhost:${own}`,
    set: (next) => {
      state = next;
    },
    offerNewWorker: () => {
      tail = `\n// another build`;
    },
  };
}
