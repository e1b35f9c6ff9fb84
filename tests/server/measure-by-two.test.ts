import { beforeAll, describe, expect, it } from 'vitest';
import { type FindOpeningsInput, findOpeningsInput } from '@/lib/contracts/openings';
import { createCrewInput } from '@/lib/contracts/visits';
import { listCrewHours } from '@/server/days/list-crew-hours';
import { createCrew } from '@/server/shops/create-crew';
import { changeCrew } from '@/server/visits/change-crew';
import { findOpenings } from '@/server/visits/find-openings';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('a measure that takes two', () => {
  let shop: TestShop;
  let first: string;
  let second: string;
  let pair: string;
  const names = (ids: string[]) =>
    [...new Set(ids)].map((id) => ({ [first]: 'first', [second]: 'second', [pair]: 'pair' })[id]);
  beforeAll(async () => {
    shop = await makeShop();
    const { measurer, owner } = shop.people;
    first = (await makeCrew(shop, 'measure', [measurer.personId])).crewId;
    second = (await makeCrew(shop, 'measure', [owner.personId])).crewId;
    pair = (await makeCrew(shop, 'measure', [measurer.personId, owner.personId])).crewId;
  });

  async function book(crewId: string, date: string, time = '09:00') {
    const { jobId } = await startTestJob(shop);
    return bookTestVisit(shop, { jobId, crewId, date, time });
  }
  async function ask(input: Partial<FindOpeningsInput>) {
    const jobId = input.jobId ?? (await startTestJob(shop)).jobId;
    const asked = findOpeningsInput.parse({ kind: 'site-measure', limit: 60, ...input, jobId });
    const { openings } = await findOpenings(await contextOf(shop, 'scheduler'), asked);
    return openings;
  }

  it('takes both for that time: the database books neither of them elsewhere, nor both where one is out', async () => {
    await book(pair, '2026-12-10');
    for (const crewId of [first, second]) {
      const refusal = await refusalOf(book(crewId, '2026-12-10', '09:30'));
      expect(refusal).toMatchObject({ status: 409, code: 'crew-already-booked' });
      expect(refusal.message).toMatch(/ Test is taken Thu, Dec 10/);
    }
    await book(second, '2026-12-11');
    expect(await refusalOf(book(pair, '2026-12-11', '09:30'))).toMatchObject({
      code: 'crew-already-booked',
    });
  });

  it('is offered where both are free, and a measure for one takes nobody along', async () => {
    const day = { from: '2026-12-11', until: '2026-12-11' };
    const one = await ask(day);
    expect(names(one.map(({ crewId }) => crewId)).sort()).toEqual(['first', 'second']);
    const two = await ask({ ...day, peopleNeeded: 2 });
    expect(names(two.map(({ crewId }) => crewId))).toEqual(['pair']);
    const taken = { from: Date.parse('2026-12-11T14:00Z'), until: Date.parse('2026-12-11T15:00Z') };
    for (const { startsAt, endsAt } of two) {
      expect(Date.parse(endsAt) <= taken.from || Date.parse(startsAt) >= taken.until).toBe(true);
    }
  });

  it('moves to where both are free again, without anybody saying so', async () => {
    const visit = await book(pair, '2026-12-14');
    const other = await ask({ jobId: visit.jobId, visitId: visit.id, from: '2026-12-14' });
    expect(names(other.map(({ crewId }) => crewId))).toEqual(['pair']);
  });

  it('stands in the diary as time taken of each one’s own crew', async () => {
    const ctx = await contextOf(shop, 'scheduler');
    const hours = await listCrewHours(ctx, { from: '2026-12-10', to: '2026-12-11' });
    const elsewhere = (crewId: string) => hours.find((crew) => crew.crewId === crewId)?.elsewhere;
    expect(elsewhere(first)).toMatchObject([{ startsAt: '2026-12-10T14:00:00.000Z' }]);
    expect(elsewhere(second)).toHaveLength(1);
    expect(elsewhere(pair)).toEqual([]);
  });

  it('of somebody who goes with another crew on other weekdays holds nobody up on the rest', async () => {
    const owner = await contextOf(shop, 'owner');
    const { bench, scheduler } = shop.people;
    const made = createCrewInput.parse({
      name: 'Thursdays',
      does: 'measure',
      colour: '2',
      personIds: [bench.personId],
    });
    const { id: thursdays } = await createCrew(owner, made);
    const mixed = (await makeCrew(shop, 'measure', [scheduler.personId, bench.personId])).crewId;
    await changeCrew(owner, {
      crewId: mixed,
      isTrial: false,
      members: [
        { personId: scheduler.personId, weekdays: null },
        { personId: bench.personId, weekdays: [1, 2, 3] },
      ],
    });
    await bookTestVisit(shop, {
      ...(await startTestJob(shop)),
      crewId: thursdays,
      date: '2026-12-17',
      time: '08:00',
      workMinutes: 420,
    });
    const day = { from: '2026-12-17', until: '2026-12-17', crewIds: [mixed] };
    expect((await ask(day)).length).toBeGreaterThan(0);
  });
});
