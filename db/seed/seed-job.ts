import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/database';
import { consents, customers, jobs, sites } from '@/db/schema';
import type { DemoJob } from './demo-jobs';
import { fictionPhone } from './phones';
import type { SeedShop } from './seed-demo';
import { seedRoom } from './seed-room';
import { seedSignOff } from './seed-sign-off';
import { seedSnag } from './seed-snag';
import { type StoryLine, seedStory } from './seed-story';
import { seedVisit } from './seed-visit';
import { workday } from './workday';

type Planned = {
  job: DemoJob;
  number: number;
  place: { town: string; latitude: number; longitude: number };
};

/** One job with its customer, its site, its visits, and its room where it has been measured. */
export async function seedJob(tx: Transaction, shop: SeedShop, { job, number, place }: Planned) {
  const customerId = randomUUID();
  const siteId = randomUUID();
  const jobId = randomUUID();
  const phone = fictionPhone(number - 2400 + 42);
  const [first = 'customer'] = job.customer.toLowerCase().normalize('NFD').split(' ');
  await tx.insert(customers).values({
    id: customerId,
    shopId: shop.id,
    name: job.customer,
    phone,
    email: `${first.replace(/[^a-z]/g, '')}.${number}@island.example`,
    language: job.language ?? 'en',
  });
  await tx.insert(consents).values(
    (['sms', 'email'] as const).map((channel) => ({
      shopId: shop.id,
      customerId,
      channel,
      given: true,
      how: 'asked on the phone',
      byPersonId: shop.staff.scheduler,
    })),
  );
  await tx.insert(sites).values({
    id: siteId,
    shopId: shop.id,
    customerId,
    street: `${job.house} ${job.street}`,
    zone: shop.zone,
    wayIn: wayIn(job),
    floorsUp: job.title.includes('third floor') ? 3 : 0,
    yearBuilt: job.yearBuilt ?? null,
    ...place,
  });
  const startedAt = workday(shop, earliestDay(job) - 6, '10:00');
  await tx.insert(jobs).values({
    id: jobId,
    shopId: shop.id,
    number,
    title: job.title,
    customerId,
    siteId,
    stage: job.stage,
    wallsReady: job.wallsReady ?? 'closed',
    floorAgreed: job.floorAgreed ?? false,
    readyOn:
      job.readyDay === undefined
        ? null
        : workday(shop, job.readyDay, '08:00').toISOString().slice(0, 10),
    readySaidAt: job.readyDay === undefined ? null : shop.now,
    notReady: job.notReady ?? '',
    unitCount: job.units,
    createdAt: startedAt,
  });
  const story: StoryLine[] = [
    {
      at: startedAt,
      by: 'scheduler',
      verb: 'start-job',
      subjectKind: 'job',
      subjectId: jobId,
      summary: `Job ${number} started from a call`,
    },
  ];
  const { customer } = job;
  for (const visit of job.visits ?? []) {
    story.push(...(await seedVisit(tx, shop, { jobId, customer, visit })));
  }
  for (const snag of job.snags ?? []) story.push(...(await seedSnag(tx, shop, { jobId, snag })));
  if (job.room) story.push(...(await seedRoom(tx, shop, { jobId, job, plan: job.room })));
  await seedStory(tx, { shopId: shop.id, jobId, now: shop.now }, story);
  await seedSignOff(tx, shop, { jobId, job });
}

const earliestDay = (job: DemoJob) => Math.min(0, ...(job.visits ?? []).map(({ day }) => day));

function wayIn(job: DemoJob): string {
  if (job.title.includes('third floor')) return 'Side door, stairs to the third floor, no lift.';
  return job.house % 2 === 0 ? 'Front door. Van at the kerb.' : 'Back door from the lane.';
}
