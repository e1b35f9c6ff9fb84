/** A web server on loopback that answers GETs with JSON, and has faults when it is asked to. */
import { createServer } from 'node:http';
import { setTimeout as wait } from 'node:timers/promises';
import { faultSwitch } from './fault-switch';
import { LOOPBACK, listenOnLoopback, trackSockets } from './listening';

export type JsonFault =
  /** Answered with this status and nothing of use: 429, 500, 503 … */
  | { kind: 'refuse'; status: number }
  /** Answered, but only after this long. */
  | { kind: 'slow'; delayMs: number }
  /** The connection breaks without an answer. */
  | { kind: 'drop' }
  /** An answer that is not of the protocol. */
  | { kind: 'garbage' };

export type JsonAnswer = { status: number; body: unknown };
export type FakeJsonServer = Awaited<ReturnType<typeof startFakeJsonServer>>;

export async function startFakeJsonServer(answer: (url: URL) => JsonAnswer, port = 0) {
  const faults = faultSwitch<JsonFault>();
  const asked: string[] = [];
  const server = createServer(async (request, response) => {
    const url = new URL(request.url ?? '/', 'http://fake.example');
    asked.push(`${url.pathname}${url.search}`);
    const fault = faults.take(url.pathname);
    if (fault?.kind === 'drop') return request.socket.destroy();
    if (fault?.kind === 'slow') await wait(fault.delayMs);
    const { status, body } =
      fault?.kind === 'refuse' ? { status: fault.status, body: {} } : answer(url);
    response.writeHead(status, { 'content-type': 'application/json; charset=utf-8' });
    response.end(fault?.kind === 'garbage' ? '<html>Gateway</html>' : JSON.stringify(body));
  });
  const sockets = trackSockets(server);
  const baseUrl = `http://${LOOPBACK}:${await listenOnLoopback(server, port)}`;
  return {
    baseUrl,
    faults,
    /** Every address that was asked for, oldest first. */
    asked: (): readonly string[] => asked.slice(),
    async stop(): Promise<void> {
      sockets.dropAll();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}
