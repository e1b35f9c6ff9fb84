import { seedDemo } from '@/db/seed/seed-demo';
import { startBackUps } from '@/server/base/back-ups/start-back-ups';
import { database } from '@/server/base/database';
import { env } from '@/server/base/env';
import { log } from '@/server/base/log';
import { repeat } from '@/server/base/repeat';
import { placeDueSites } from '@/server/jobs/place-due-sites';
import { forgetOld } from '@/server/keeping/forget-old';
import { startWorker } from '@/server/messages/worker';
import { hashPassword } from '@/server/people/sign-in';
import { getPorts } from '@/server/ports/choose-ports';
import { sendDeliveries } from '@/server/programs/send-deliveries';
import { keepDemoSignOff } from '@/server/snags/keep-demo-sign-off';
import { signedCopyOf } from '@/server/snags/tell-signed';
import { composeWithCopy } from '@/server/visits/compose-message';
import { noticeSilence } from '@/server/visits/notice-silence';
import { startLapsing } from '@/server/visits/start-lapsing';
import { makeVisitLink } from '@/server/visits/visit-link';

/** Other programs hear of a change within so long. */
const tellEveryMs = 5_000;
const placeEveryMs = 2_000;
const forgetEveryMs = 6 * 3_600_000;

/** Once a process, before the first request is answered. */
export async function startUp(): Promise<void> {
  const { building, demo, dataDirectory, backUpDirectory } = env();
  if (building) return;
  const open = await database();
  const { geocode } = await getPorts();
  if (demo) {
    await seedDemo(open.db, {
      now: new Date(),
      hashPassword,
      linkVisit: (tx, { shopId, ...visit }) => makeVisitLink(tx, { shop: { id: shopId } }, visit),
      signOff: keepDemoSignOff,
    });
  }
  const stopWorker = startWorker(composeWithCopy(signedCopyOf), [noticeSilence]);
  const stopLapsing = startLapsing();
  const stopBackUps = startBackUps(open, { dataDirectory, backUpDirectory });
  const telling = repeat('programs', tellEveryMs, () => sendDeliveries(open.db, new Date()));
  const placing = repeat('jobs/place-due-sites', placeEveryMs, () =>
    placeDueSites(open.db, geocode, new Date()),
  );
  const forgetting = repeat('keeping', forgetEveryMs, () => forgetOld(open.db, new Date()));
  log('started', { database: open.kind, demo });

  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, async () => {
      await Promise.all([
        stopWorker(),
        stopLapsing(),
        stopBackUps(),
        telling.stop(),
        placing.stop(),
        forgetting.stop(),
      ]);
      await open.close();
      log('stopped');
      process.exit(0);
    });
  }
}
