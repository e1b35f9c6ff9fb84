import type { StartJobInput } from '@/lib/contracts/jobs';
import { startJobInput } from '@/lib/contracts/jobs';
import { startJob } from '@/server/jobs/start-job';
import { contextOf, type TestShop } from './make-shop';

type Given = Partial<Omit<StartJobInput, 'customer' | 'site'>> & {
  customer?: Partial<StartJobInput['customer']>;
  site?: Partial<StartJobInput['site']>;
};

/** A job that may be measured at once, of a customer who may be told both ways. */
export async function startTestJob(shop: TestShop, given: Given = {}, now?: Date) {
  const { customer, site, ...job } = given;
  const input = startJobInput.parse({
    title: 'Kitchen, L, 11 units',
    wallsReady: 'closed',
    unitCount: 11,
    ...job,
    customer: {
      name: 'Robin Testwood',
      phone: '(212) 555-0147',
      email: 'robin@customer.example',
      mayText: true,
      mayEmail: true,
      ...customer,
    },
    site: { street: '12 Alder Row', town: 'Fernhollow', wayIn: 'Side door', ...site },
  });
  const { id, number } = await startJob(await contextOf(shop, 'scheduler', now), input);
  return { jobId: id, number };
}
