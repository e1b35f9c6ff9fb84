import { createHash } from 'node:crypto';
import { existsSync, realpathSync } from 'node:fs';
import { connect } from 'node:net';

/** Whether a running program holds this database directory; the same socket name as db/owner-lock.ts. */
export async function isOwned(directory) {
  if (!existsSync(directory)) return false;
  const name = createHash('sha256').update(realpathSync(directory)).digest('hex').slice(0, 40);
  return new Promise((resolve) => {
    const socket = connect(`\0setwell-${name}`);
    socket.once('connect', () => {
      socket.destroy();
      resolve(true);
    });
    socket.once('error', () => resolve(false));
  });
}
