import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { messages, webhookDeliveries, webhooks } from '@/db/schema';
import { database } from '@/server/base/database';
import { getToday } from '@/server/days/get-today';
import { recordDayEvents } from '@/server/days/record-day-events';
import { openSnag } from '@/server/snags/open-snag';
import { reportVisit } from '@/server/visits/report-visit';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { type PutStop, putStop, signing, tap } from '../help/put-stop';
import { startTestJob } from '../help/start-test-job';

describe('what a crew’s taps set off', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  const crew = (stop: PutStop) => contextOf(shop, 'crew', stop.now);
  const send = async (stop: PutStop, ...events: unknown[]) =>
    recordDayEvents(await crew(stop), { events });
  const finish = async (stop: PutStop) =>
    reportVisit(await crew(stop), {
      visitId: stop.visit.id,
      what: 'done',
      at: stop.now.toISOString(),
    });
  const doneNotes = async (stop: PutStop) => {
    const { db } = await database();
    const rows = await db
      .select({ channel: messages.channel, state: messages.state })
      .from(messages)
      .where(and(eq(messages.visitId, stop.visit.id), eq(messages.occasion, 'done')));
    return rows.filter(({ state }) => state !== 'withdrawn').map(({ channel }) => channel);
  };

  it('a signature tells other programs once, though the phone sent it twice', async () => {
    const { db } = await database();
    const listens = { shopId: shop.shop.id, madeBy: shop.people.owner.personId };
    const [webhook] = await db
      .insert(webhooks)
      .values({ ...listens, url: 'https://hear.example/', events: ['job.signed-off'] })
      .returning({ id: webhooks.id });
    const stop = await putStop(shop);
    const signed = tap(stop, 'sign-off', signing);
    await send(stop, signed);
    await send(stop, signed);
    await send(stop, tap(stop, 'sign-off', signing));
    const told = await db
      .select({ event: webhookDeliveries.event, subject: webhookDeliveries.subject })
      .from(webhookDeliveries)
      .where(eq(webhookDeliveries.webhookId, webhook?.id ?? ''));
    const { jobId } = stop;
    const subject = { signOffId: signed.id, visitId: stop.visit.id, jobId };
    expect(told).toEqual([{ event: 'job.signed-off', subject }]);
    await db.delete(webhookDeliveries).where(eq(webhookDeliveries.webhookId, webhook?.id ?? ''));
    await db.delete(webhooks).where(eq(webhooks.id, webhook?.id ?? ''));
  });

  it('the end of a visit is told once, whether they tap or sign first', async () => {
    const stop = await putStop(shop);
    await send(stop, tap(stop, 'sign-off', signing));
    await finish(stop);
    expect((await doneNotes(stop)).sort()).toEqual(['email', 'sms']);
  });

  it('signed after the text has gone, the copy goes by e-mail and no second text follows', async () => {
    const stop = await putStop(shop);
    await finish(stop);
    const { db } = await database();
    await db
      .update(messages)
      .set({ state: 'sent' })
      .where(and(eq(messages.visitId, stop.visit.id), eq(messages.occasion, 'done')));
    await send(stop, tap(stop, 'sign-off', signing));
    expect((await doneNotes(stop)).sort()).toEqual(['email', 'email', 'sms']);
  });

  it('two jobs of one customer on a day end twice, each told once', async () => {
    const stops = [await putStop(shop), await putStop(shop)];
    for (const stop of stops) await finish(stop);
    for (const stop of stops) expect((await doneNotes(stop)).sort()).toEqual(['email', 'sms']);
  });
});

describe('what a crew has to mend', () => {
  it('is listed across its jobs by due date, and nothing of another crew, the bench or a closed one', async () => {
    const shop = await makeShop();
    const [one, other] = [await putStop(shop), await putStop(shop)];
    const office = await contextOf(shop, 'scheduler', one.now);
    const add = async (jobId: string, words: string, more: object = {}) => {
      const id = randomUUID();
      await openSnag(office, {
        ...{ id, jobId, words, kind: 'fault', mender: 'crew', dueOn: null },
        ...{ roomId: null, unitId: null, place: '', photoIds: [], ...more },
      });
      return id;
    };
    const undated = await add(one.jobId, 'Handle is loose');
    const pressing = await add(other.jobId, 'Door rubs', { dueOn: '2027-02-20' });
    const later = await add(one.jobId, 'Panel is scratched', { dueOn: '2027-03-30' });
    await add(one.jobId, 'Front to be made', { mender: 'bench' });
    await add((await startTestJob(shop)).jobId, 'No visit of this crew');
    const listed = async (role: 'crew' | 'measurer' | 'bench' | 'scheduler') =>
      (await getToday(await contextOf(shop, role, one.now), {})).snags;

    const snags = await listed('crew');
    expect(snags.map(({ id }) => id)).toEqual([pressing, later, undated]);
    expect(snags[0]).toMatchObject({ isLate: true, visitId: other.visit.id });
    expect(snags[0]?.nextOn).toBe(other.visit.startsAt.slice(0, 10));
    expect(await listed('measurer')).toEqual([]);
    expect(await listed('bench')).toEqual([]);
    // The office has its own list, of every crew.
    expect(await listed('scheduler')).toEqual([]);

    const closing = { snagId: pressing, words: 'planed', photoIds: [] };
    await recordDayEvents(await contextOf(shop, 'crew', other.now), {
      events: [tap(other, 'close-snag', closing)],
    });
    expect((await listed('crew')).map(({ id }) => id)).toEqual([later, undated]);
    const stranger = await makeShop();
    expect((await getToday(await contextOf(stranger, 'owner', one.now), {})).snags).toEqual([]);
  });
});
