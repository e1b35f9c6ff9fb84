import { beforeAll, describe, expect, it } from 'vitest';
import { PATCH as closedDaysRoute } from '@/app/api/closed-days/route';
import { PATCH as changeCrewRoute } from '@/app/api/crews/[crewId]/route';
import { GET as settingsRoute } from '@/app/api/crews/settings/route';
import { DELETE as removeDaysOffRoute } from '@/app/api/days-off/[daysOffId]/route';
import { POST as addDaysOffRoute } from '@/app/api/days-off/route';
import type { CrewChange, CrewsView } from '@/lib/contracts/crews';
import { bookingDays } from '@/server/shops/booking-days';
import { whoComes } from '@/server/visits/visit-people';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

/** Week of Thursday 2099-12-10: far ahead, because routes ask the real clock. */
const thursday = '2099-12-10';
const friday = '2099-12-11';
const day = (weekday: number, start = '08:00', end = '16:00') => ({ weekday, start, end });
const mondayToThursday = { weeks: [[1, 2, 3, 4].map((at) => day(at))], firstWeekOf: '2099-12-07' };

describe('crews', () => {
  let shop: TestShop;
  let scheduler: string;
  beforeAll(async () => {
    shop = await makeShop();
    scheduler = await cookieOf(shop.people.scheduler);
  });

  const change = async (crewId: string, body: object, cookie = scheduler) =>
    callRoute(changeCrewRoute, { method: 'PATCH', cookie, params: { crewId }, body });
  const settings = async (cookie = scheduler) => {
    const { body } = await callRoute(settingsRoute, { method: 'GET', cookie });
    return body as CrewsView;
  };
  const addOff = (body: object, cookie = scheduler) => callRoute(addDaysOffRoute, { cookie, body });

  async function bookedCrew(date: string, personIds?: string[], of = shop) {
    const { crewId, name } = await makeCrew(of, 'measure', personIds);
    const { jobId } = await startTestJob(of);
    const visit = await bookTestVisit(of, { jobId, crewId, date });
    return { crewId, name, visit };
  }
  const goers = async (visitId: string) => {
    const ctx = await contextOf(shop, 'scheduler');
    return whoComes(ctx.db, ctx, visitId);
  };

  it('are changed by the office alone, and by nobody of another shop', async () => {
    const { crewId } = await makeCrew(shop, 'fit', []);
    const other = await makeShop();
    expect((await change(crewId, { name: 'X' }, await cookieOf(shop.people.crew))).status).toBe(
      403,
    );
    expect((await change(crewId, { name: 'X' }, await cookieOf(other.people.owner))).status).toBe(
      404,
    );
    const stranger = { members: [{ personId: other.people.crew.personId, weekdays: null }] };
    expect((await change(crewId, stranger)).status).toBe(404);
    expect((await callRoute(settingsRoute, { method: 'GET' })).status).toBe(401);
    const theirs = await settings(await cookieOf(other.people.owner));
    expect(theirs.crews).toEqual([]);
    const off = { personId: shop.people.crew.personId, firstDay: thursday, lastDay: friday };
    expect((await addOff(off, await cookieOf(shop.people.crew))).status).toBe(403);
    expect((await addOff(off, await cookieOf(other.people.owner))).status).toBe(404);
    const closed = {
      method: 'PATCH',
      cookie: await cookieOf(shop.people.bench),
      body: {},
    } as const;
    expect((await callRoute(closedDaysRoute, closed)).status).toBe(403);
  });

  it('keep their days and hours, base, kinds and people as given', async () => {
    const { crewId } = await makeCrew(shop, 'measure', []);
    const given = {
      name: 'Measure West',
      colour: '5',
      kinds: ['site-measure', 'worktop-template'],
      pattern: {
        weeks: [
          [day(1), day(2)],
          [day(1), day(2), day(6, '08:00', '12:00')],
        ],
        firstWeekOf: '2099-12-07',
      },
      base: { address: '3 Kiln Yard, Juniper Bend', place: { lat: 41.287, lon: -58.317 } },
      members: [{ personId: shop.people.measurer.personId, weekdays: [1, 2] }],
    };
    const answer = await change(crewId, given);
    expect(answer.body).toEqual({ isKept: true, newlyOutside: [] });
    const kept = (await settings()).crews.find(({ id }) => id === crewId);
    expect(kept).toMatchObject({ ...given, hasOwnPattern: true });
    await change(crewId, { pattern: null });
    expect((await settings()).crews.find(({ id }) => id === crewId)).toMatchObject({
      hasOwnPattern: false,
      pattern: { weeks: [[1, 2, 3, 4, 5].map((weekday) => day(weekday))] },
    });
    await change(crewId, { members: [] });
  });

  it('are refused a pattern that cannot be worked, and a name that is taken', async () => {
    const { crewId } = await makeCrew(shop, 'measure', []);
    const { name } = await makeCrew(shop, 'measure', []);
    const backwards = { pattern: { weeks: [[day(1, '16:00', '08:00')]], firstWeekOf: thursday } };
    expect((await change(crewId, backwards)).body).toMatchObject({
      errors: { 'pattern.weeks': 'A day ends before it starts.' },
    });
    expect((await change(crewId, { name })).status).toBe(409);
  });

  it('leave visits where they are when their days change, and say which stand outside', async () => {
    const { crewId, visit, name } = await bookedCrew(friday);
    const trial = await change(crewId, { pattern: mondayToThursday, isTrial: true });
    const outside = { visitId: visit.id, why: `not a working day of ${name}`, date: friday };
    expect(trial.body).toMatchObject({ isKept: false, newlyOutside: [outside] });
    expect((await settings()).outside).toEqual([]);
    const kept = await change(crewId, { pattern: mondayToThursday });
    expect(kept.body).toMatchObject({ isKept: true, newlyOutside: [outside] });
    expect((await settings()).outside).toMatchObject([outside]);
    // Said once: what stood outside already is no news of the next change.
    expect((await change(crewId, { colour: '2' })).body).toMatchObject({ newlyOutside: [] });
    await change(crewId, { pattern: { ...mondayToThursday, weeks: [[day(5, '09:30', '16:00')]] } });
    expect((await settings()).outside).toMatchObject([
      { why: "begins at 9:00 AM, the crew's day at 9:30 AM" },
    ]);
    await change(crewId, { pattern: null, kinds: ['check-measure'] });
    expect((await settings()).outside).toMatchObject([{ why: `${name} does not go out for this` }]);
    await change(crewId, { kinds: [] });
    expect((await settings()).outside).toEqual([]);
    await change(crewId, { members: [] });
  });

  it('share a person on different days, and never on one', async () => {
    const { personId } = shop.people.crew;
    const onThursday = await bookedCrew('2099-12-17', [personId]);
    const alsoThursday = await bookedCrew('2099-12-17', []);
    const clash = await change(alsoThursday.crewId, { members: [{ personId, weekdays: null }] });
    expect(clash.status).toBe(409);
    expect(clash.body).toMatchObject({
      code: 'person-already-booked',
      detail: expect.stringContaining(`Crew Test is with ${onThursday.name} on Thu, Dec 17`),
    });
    expect(await goers(alsoThursday.visit.id)).toEqual([]);
    await change(onThursday.crewId, { members: [{ personId, weekdays: [1, 2, 3] }] });
    expect(await goers(onThursday.visit.id)).toEqual([]);
    const shared = await change(alsoThursday.crewId, { members: [{ personId, weekdays: [4, 5] }] });
    expect(shared.status).toBe(200);
    expect(await goers(alsoThursday.visit.id)).toEqual(['Crew']);
    for (const { crewId } of [onThursday, alsoThursday]) await change(crewId, { members: [] });
  });

  it('are told of a day off, go without that person, and have them back when it is taken back', async () => {
    const { personId } = shop.people.measurer;
    const { crewId, visit } = await bookedCrew('2099-12-23', [personId]);
    const off = { personId, firstDay: '2099-12-22', lastDay: '2099-12-24', reason: 'wedding' };
    const trial = (await addOff({ ...off, isTrial: true })).body as CrewChange;
    expect(trial).toMatchObject({
      isKept: false,
      newlyOutside: [{ visitId: visit.id, why: 'Measurer Test is off' }],
    });
    expect(await goers(visit.id)).toEqual(['Measurer']);
    await addOff(off);
    expect(await goers(visit.id)).toEqual([]);
    const office = (await settings()).people.find(({ id }) => id === personId);
    expect(office?.daysOff).toMatchObject([
      { words: 'Tue, Dec 22 to Thu, Dec 24', reason: 'wedding' },
    ]);
    const crewSees = await settings(await cookieOf(shop.people.crew));
    expect(crewSees.people.find(({ id }) => id === personId)?.daysOff).toMatchObject([
      { reason: '' },
    ]);
    const daysOffId = office?.daysOff[0]?.id ?? '';
    const other = await cookieOf((await makeShop()).people.owner);
    const remove = (cookie: string) =>
      callRoute(removeDaysOffRoute, { method: 'DELETE', cookie, params: { daysOffId } });
    expect((await remove(other)).status).toBe(404);
    expect((await remove(await cookieOf(shop.people.bench))).status).toBe(403);
    expect((await remove(scheduler)).status).toBe(200);
    expect(await goers(visit.id)).toEqual(['Measurer']);
    const backwards = { personId, firstDay: friday, lastDay: thursday };
    expect((await addOff(backwards)).body).toMatchObject({
      errors: { lastDay: 'The last day is before the first.' },
    });
    await change(crewId, { members: [] });
  });

  it('keep the public holidays of a place, but for those that the shop works', async () => {
    const { crewId, visit } = await bookedCrew('2099-12-25', []);
    const close = (body: object) =>
      callRoute(closedDaysRoute, { method: 'PATCH', cookie: scheduler, body });
    const place = { country: 'US', part: 'NY' };
    expect((await close({ holidays: { country: 'XX' } })).status).toBe(422);
    const kept = (await close({ holidays: place })).body as CrewChange;
    expect(kept.isKept).toBe(true);
    const { publicHolidays, holidays } = await settings();
    expect(holidays).toMatchObject(place);
    expect(publicHolidays.map(({ name }) => name)).toContain('Independence Day');

    const atThatTime = await contextOf(shop, 'scheduler', new Date('2099-12-01T15:00:00Z'));
    expect(bookingDays(atThatTime).closedDays).toContain('2099-12-25');
    const { jobId } = await startTestJob(shop);
    const booked = await bookTestVisit(
      shop,
      { jobId, crewId, date: '2099-12-25', time: '13:00' },
      new Date('2099-12-01T15:00:00Z'),
    );
    expect(booked.warnings.join(' ')).toContain('not a working day');
    await close({ holidays: { ...place, worked: ['2099-12-25'] } });
    const after = await contextOf(shop, 'scheduler', new Date('2099-12-01T15:00:00Z'));
    expect(bookingDays(after).closedDays).not.toContain('2099-12-25');

    const closed = (await close({ closedDays: ['2099-12-25'] })).body as CrewChange;
    expect(closed.newlyOutside.map(({ visitId }) => visitId)).toEqual([visit.id, booked.id]);
    expect(closed.newlyOutside[0]?.why).toBe('the shop is closed');
    await close({ closedDays: [], holidays: null });
  });

  it('with days of their own are booked over them', async () => {
    const { crewId } = await makeCrew(shop, 'fit', []);
    await change(crewId, {
      pattern: {
        weeks: [[day(1, '07:00', '11:00'), day(3, '07:00', '11:00')]],
        firstWeekOf: '2099-12-07',
      },
    });
    const { jobId } = await startTestJob(shop);
    const { pieces } = await bookTestVisit(shop, {
      jobId,
      crewId,
      kind: 'install',
      date: '2099-11-02',
      time: '07:00',
      workMinutes: 480,
      overrideReason: 'test',
    });
    // Monday and Wednesday, four hours each, on either side of no clock change.
    expect(pieces.map(({ startsAt, endsAt }) => [startsAt, endsAt])).toEqual([
      ['2099-11-02T12:00:00.000Z', '2099-11-02T16:00:00.000Z'],
      ['2099-11-04T12:00:00.000Z', '2099-11-04T16:00:00.000Z'],
    ]);
  });
});
