import { seedDemo } from '@/db/seed/seed-demo';
import { startBackUps } from '@/server/base/back-ups/start-back-ups';
import { database } from '@/server/base/database';
import { env } from '@/server/base/env';
import { log } from '@/server/base/log';
import { startWorker } from '@/server/messages/worker';
import { hashPassword } from '@/server/people/sign-in';
import { getPorts } from '@/server/ports/choose-ports';
import { composeVisitMessage } from '@/server/visits/compose-message';
import { makeVisitLink } from '@/server/visits/visit-link';

/** Once a process, before the first request is answered. */
export async function startUp(): Promise<void> {
  const { building, demo, dataDirectory, backUpDirectory } = env();
  if (building) return;
  const open = await database();
  await getPorts();
  if (demo) {
    await seedDemo(open.db, {
      now: new Date(),
      hashPassword,
      linkVisit: (tx, { shopId, ...visit }) => makeVisitLink(tx, { shop: { id: shopId } }, visit),
    });
  }
  const stopWorker = startWorker(composeVisitMessage);
  const stopBackUps = startBackUps(open, { dataDirectory, backUpDirectory });
  log('started', { database: open.kind, demo });

  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, async () => {
      await Promise.all([stopWorker(), stopBackUps()]);
      await open.close();
      log('stopped');
      process.exit(0);
    });
  }
}
