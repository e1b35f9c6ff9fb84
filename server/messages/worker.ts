import type { Database } from '@/db/database';
import { database } from '@/server/base/database';
import { logBug } from '@/server/base/log';
import { type Repeated, repeat } from '@/server/base/repeat';
import { getPorts } from '@/server/ports/choose-ports';
import { askLate } from './ask-late';
import type { Compose } from './compose';
import { sendDue } from './send-due';
import { settle } from './settle';

const tickMs = 2_000;

/** Held for the process: the bundler makes several copies of this module. */
const held = globalThis as typeof globalThis & { __setwellWorker?: Repeated };

/** What else falls due with the clock, and is known to a room above. */
export type Alongside = (db: Database, now: Date) => Promise<void>;

/**
 * Sends what is due, every two seconds and when kicked, after what falls due beside it; gives what stops it
 * after the round under way.
 */
export function startWorker(
  compose: Compose,
  alongside: readonly Alongside[] = [],
): () => Promise<void> {
  held.__setwellWorker ??= startRounds(compose, alongside);
  return held.__setwellWorker.stop;
}

function startRounds(compose: Compose, alongside: readonly Alongside[]): Repeated {
  const rounds = repeat('messages/worker', tickMs, async () => {
    const { db } = await database();
    for (const work of alongside) {
      await work(db, new Date()).catch((error) => logBug('messages/worker alongside', error));
    }
    const sending = { db, ports: await getPorts(), compose, now: () => new Date() };
    await settle(sending);
    await sendDue(sending);
    await askLate(sending);
  });
  rounds.kick();
  return {
    ...rounds,
    stop: async () => {
      await rounds.stop();
      held.__setwellWorker = undefined;
    },
  };
}

/** Something was put into the outbox and committed: no need to wait for the next round. */
export function kickWorker(): void {
  held.__setwellWorker?.kick();
}
