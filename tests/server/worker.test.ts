import { afterAll, expect, it } from 'vitest';
import { startWorker } from '@/server/messages/worker';
import { getPorts } from '@/server/ports/choose-ports';
import { composeVisitMessage } from '@/server/visits/compose-message';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { makeShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

afterAll(async () => {
  const { fakes } = await getPorts();
  await Promise.all([fakes.sms?.stop(), fakes.email?.stop()]);
});

it('sends what a booking puts into the outbox by itself, and stops when told to', async () => {
  const shop = await makeShop();
  const { crewId } = await makeCrew(shop);
  const { fakes } = await getPorts();
  const mails = (address: string) => fakes.email?.mailsFor(address).length ?? 0;
  const book = async (email: string, date: string) => {
    const { jobId } = await startTestJob(shop, { customer: { email } });
    // Half a minute ago: what a booking tells waits until it can no longer be undone.
    await bookTestVisit(shop, { jobId, crewId, date }, new Date(Date.now() - 30_000));
  };
  const stop = startWorker(composeVisitMessage);
  expect(startWorker(composeVisitMessage)).toBe(stop);
  await book('first@customer.example', '2033-03-03');
  await expect.poll(() => mails('first@customer.example'), { timeout: 10_000 }).toBe(1);
  await stop();
  await book('second@customer.example', '2033-03-04');
  await new Promise((resolve) => setTimeout(resolve, 2_500));
  expect(mails('second@customer.example')).toBe(0);
});
