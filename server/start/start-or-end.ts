import { logBug } from '@/server/base/log';
import { startUp } from './start-up';

/** What cannot start says why and ends: Next would go on listening with nothing behind it. */
export async function startOrEnd(): Promise<void> {
  try {
    await startUp();
  } catch (error) {
    logBug('start', error);
    const why = error instanceof Error ? error.message : String(error);
    process.stderr.write(`Setwell did not start. ${why}\n`);
    process.exit(1);
  }
}
