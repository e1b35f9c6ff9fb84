import { createHash } from 'node:crypto';
import { mkdirSync, realpathSync } from 'node:fs';
import { createServer, type Server } from 'node:net';

/**
 * The embedded database has no lock of its own, and a second process on its directory makes acknowledged
 * rows vanish. An abstract socket dies with its process, also after kill -9, so it cannot be left behind.
 */
export async function takeOwnerLock(directory: string): Promise<Server> {
  mkdirSync(directory, { recursive: true });
  const name = createHash('sha256').update(realpathSync(directory)).digest('hex').slice(0, 40);
  const server = createServer((socket) => socket.destroy());
  await new Promise<void>((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      reject(
        error.code === 'EADDRINUSE'
          ? new Error(
              `Another Setwell is running on ${directory}. Stop it first, or give this one its own folder by SETWELL_DATA.`,
            )
          : error,
      );
    });
    server.listen(`\0setwell-${name}`, resolve);
  });
  server.unref();
  return server;
}
