import { and, desc, eq, inArray, or, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import {
  addressAnswers,
  audit,
  consents,
  customers,
  files,
  idempotencyKeys,
  jobs,
  messages,
  schedulerItems,
  signOffs,
  sites,
  snags,
  visitChecks,
  visitLinks,
  visits,
} from '@/db/schema';
import { keepRefusal } from '@/server/jobs/kept-refusals';

type Of = { shopId: string; customerId: string; now: Date };
type OfJobs = { shopId: string; jobIds: string[] };

export const erasedName = 'Erased customer';

/** Takes out of every row what says who it was; gives the keys of the bytes that go once this is committed. */
export async function forgetCustomer(
  tx: Transaction,
  of: Of,
): Promise<{ jobIds: string[]; storageKeys: string[] }> {
  const { shopId, customerId } = of;
  const jobIds = (
    await tx
      .select({ id: jobs.id })
      .from(jobs)
      .where(and(eq(jobs.shopId, shopId), eq(jobs.customerId, customerId)))
  ).map(({ id }) => id);
  await keepRefusals(tx, of);
  await forgetMessages(tx, of, jobIds);
  await forgetStory(tx, { shopId, jobIds, customerId });
  await forgetVisits(tx, { shopId, jobIds });
  const storageKeys = await forgetPapers(tx, { shopId, jobIds });
  await forgetSites(tx, of);
  await tx
    .update(jobs)
    .set({ title: 'Erased', notes: '', notReady: '' })
    .where(and(eq(jobs.shopId, shopId), inArray(jobs.id, jobIds)));
  await tx
    .update(customers)
    .set({ name: erasedName, phone: '', email: '', untextablePhone: '', erasedAt: of.now })
    .where(and(eq(customers.shopId, shopId), eq(customers.id, customerId)));
  return { jobIds, storageKeys };
}

/** The proofs of consent hold the customer's own words: the last word of each channel stays, as a hash. */
async function keepRefusals(tx: Transaction, { shopId, customerId, now }: Of): Promise<void> {
  const newest = await tx
    .selectDistinctOn([consents.channel], {
      channel: consents.channel,
      given: consents.given,
      phone: customers.phone,
      email: customers.email,
    })
    .from(consents)
    .innerJoin(customers, eq(customers.id, consents.customerId))
    .where(and(eq(consents.shopId, shopId), eq(consents.customerId, customerId)))
    .orderBy(consents.channel, desc(consents.sequence));
  for (const { channel, given, phone, email } of newest) {
    const address = channel === 'sms' ? phone : email;
    if (!given && address) await keepRefusal(tx, { shopId, channel, address, at: now });
  }
  await tx
    .delete(consents)
    .where(and(eq(consents.shopId, shopId), eq(consents.customerId, customerId)));
}

/** That there were messages, and what they cost, stays. */
async function forgetMessages(
  tx: Transaction,
  { shopId, customerId }: Of,
  jobIds: string[],
): Promise<void> {
  const theirs = and(
    eq(messages.shopId, shopId),
    or(eq(messages.customerId, customerId), inArray(messages.jobId, jobIds)),
  );
  await tx
    .update(messages)
    .set({ state: 'withdrawn' })
    .where(and(theirs, eq(messages.state, 'waiting')));
  await tx.update(messages).set({ toAddress: '', body: '', reason: '', cause: {} }).where(theirs);
  await tx
    .delete(schedulerItems)
    .where(and(eq(schedulerItems.shopId, shopId), eq(schedulerItems.customerId, customerId)));
}

/** What was done and when stays; who said what goes. */
async function forgetStory(
  tx: Transaction,
  { shopId, jobIds, customerId }: OfJobs & { customerId: string },
): Promise<void> {
  await tx
    .update(audit)
    .set({
      summary: sql`${audit.verb}`,
      detail: {},
      actorName: sql`case when ${audit.actorKind} = 'customer' then ${erasedName} else ${audit.actorName} end`,
    })
    .where(and(eq(audit.shopId, shopId), inArray(audit.jobId, jobIds)));
  for (const id of [customerId, ...jobIds]) {
    await tx
      .delete(idempotencyKeys)
      .where(
        and(
          eq(idempotencyKeys.shopId, shopId),
          sql`${idempotencyKeys.answer}::text like ${`%${id}%`}`,
        ),
      );
  }
}

async function forgetVisits(tx: Transaction, { shopId, jobIds }: OfJobs): Promise<void> {
  const ofJobs = and(eq(visits.shopId, shopId), inArray(visits.jobId, jobIds));
  const visitIds = (await tx.select({ id: visits.id }).from(visits).where(ofJobs)).map(
    ({ id }) => id,
  );
  await tx.update(visits).set({ customerSays: '' }).where(ofJobs);
  await tx
    .delete(visitLinks)
    .where(and(eq(visitLinks.shopId, shopId), inArray(visitLinks.visitId, visitIds)));
  await tx
    .update(visitChecks)
    .set({ words: '' })
    .where(and(eq(visitChecks.shopId, shopId), inArray(visitChecks.visitId, visitIds)));
}

/** Photos show a home, a signature is a person's own. The database lets a signature go for this alone. */
async function forgetPapers(tx: Transaction, { shopId, jobIds }: OfJobs): Promise<string[]> {
  const gone = await tx
    .delete(files)
    .where(and(eq(files.shopId, shopId), inArray(files.jobId, jobIds)))
    .returning({ storageKey: files.storageKey });
  await tx.execute(sql`select set_config('setwell.erasing', 'customer', true)`);
  await tx
    .delete(signOffs)
    .where(and(eq(signOffs.shopId, shopId), inArray(signOffs.jobId, jobIds)));
  await tx.execute(sql`select set_config('setwell.erasing', '', true)`);
  await tx
    .update(snags)
    .set({
      words: 'Erased',
      place: '',
      benchSays: '',
      photoIds: [],
      closedPhotoIds: [],
      closedWords: sql`case when ${snags.closedAt} is null then '' else 'Erased' end`,
    })
    .where(and(eq(snags.shopId, shopId), inArray(snags.jobId, jobIds)));
  return gone.map(({ storageKey }) => storageKey);
}

/** The town stays: it says how far the shop drives, and nobody's door. */
async function forgetSites(tx: Transaction, { shopId, customerId }: Of): Promise<void> {
  const theirs = and(eq(sites.shopId, shopId), eq(sites.customerId, customerId));
  const streets = await tx.select({ street: sites.street }).from(sites).where(theirs);
  for (const { street } of streets.filter((site) => site.street !== '')) {
    await tx
      .delete(addressAnswers)
      .where(
        and(
          eq(addressAnswers.shopId, shopId),
          sql`position(lower(${street}) in lower(${addressAnswers.question})) > 0`,
        ),
      );
  }
  await tx
    .update(sites)
    .set({
      street: '',
      postcode: '',
      latitude: null,
      longitude: null,
      wayIn: '',
      parking: '',
      accessCodeSealed: null,
      accessCodeSetAt: null,
    })
    .where(theirs);
}
