import { sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as createCrewRoute, GET as listCrewsRoute } from '@/app/api/crews/route';
import { PATCH as changeRulesRoute, GET as getRulesRoute } from '@/app/api/rules/route';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { usualOpeningWeights } from '@/lib/schedule/planning-rules';
import { database } from '@/server/base/database';
import { callRoute } from '../help/call-route';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';

describe('shop rules and crews', () => {
  let shop: TestShop;
  let owner: string;
  let scheduler: string;
  let crew: string;
  let otherOwner: string;
  beforeAll(async () => {
    shop = await makeShop();
    owner = await cookieOf(shop.people.owner);
    scheduler = await cookieOf(shop.people.scheduler);
    crew = await cookieOf(shop.people.crew);
    otherOwner = await cookieOf((await makeShop()).people.owner);
  });

  const rules = async (cookie = crew) =>
    (await callRoute(getRulesRoute, { method: 'GET', cookie })).body as ShopSettings;
  const change = (body: unknown, cookie = owner) =>
    callRoute(changeRulesRoute, { method: 'PATCH', cookie, body });
  const crews = async (cookie = crew) =>
    (await callRoute(listCrewsRoute, { method: 'GET', cookie })).body;

  it('changes what is given, keeps the rest, and leaves another shop as it was', async () => {
    const before = await rules();
    const others = await rules(otherOwner);
    const fit = { ...before.fit, unit: 'mm' as const, stepMm: 1, fillerLeastMm: 30 };
    const answer = await change({ zone: 'America/Denver', phone: '(303) 555-0119', fit });
    expect(answer.status).toBe(200);
    expect(await rules()).toEqual({
      ...before,
      zone: 'America/Denver',
      phone: '+13035550119',
      fit,
    });
    expect(await rules(otherOwner)).toEqual(others);
    expect((await change({ zone: 'America/New_York' })).status).toBe(200);
  });

  it('has the start value of a rule that came after the shop’s were written', async () => {
    const { db } = await database();
    await db.execute(
      sql`update shops set rules = rules #- '{booking,weightDayWaited}' #- '{fit,crownSpringDeg}' where id = ${shop.shop.id}`,
    );
    const { booking, fit } = await rules();
    expect(booking.weightDayWaited).toBe(usualOpeningWeights.dayWaited);
    expect(fit.crownSpringDeg).toBe(38);
  });

  it('says at each field what cannot be', async () => {
    const { fit, booking } = await rules();
    const wrong = await change({
      fit: { ...fit, fillerLeastMm: 90, fillerMostMm: 40 },
      booking: { ...booking, dayStart: '17:00', quietFrom: '25:00', workdays: [] },
    });
    expect(wrong.status).toBe(422);
    expect(Object.keys((wrong.body as { errors: object }).errors).sort()).toEqual([
      'booking.dayEnd',
      'booking.quietFrom',
      'booking.workdays',
      'fit.fillerMostMm',
    ]);
    expect((await change({ zone: 'Atlantis/Centre' })).body).toMatchObject({
      errors: { zone: expect.any(String) },
    });
    expect((await change({ phone: '12' })).body).toMatchObject({
      errors: { phone: expect.any(String) },
    });
    expect((await rules()).fit).toEqual(fit);
  });

  it('lets only the owner change the rules, and everybody read them', async () => {
    expect((await change({ name: 'Mine now' }, scheduler)).status).toBe(403);
    expect((await rules()).name).not.toBe('Mine now');
  });

  const newCrew = (name: string, personIds: string[]) => ({
    name,
    does: 'fit',
    colour: '2',
    personIds,
  });

  it('makes a crew of people of this shop, once by each name', async () => {
    const body = newCrew('North', [shop.people.crew.personId]);
    expect((await callRoute(createCrewRoute, { cookie: scheduler, body })).status).toBe(200);
    const again = await callRoute(createCrewRoute, { cookie: scheduler, body });
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ errors: { name: expect.any(String) } });
    expect(await crews()).toMatchObject([
      { name: 'North', people: [{ id: shop.people.crew.personId, name: 'Crew Test' }] },
    ]);
    expect(await crews(otherOwner)).toEqual([]);
  });

  it('takes nobody of another shop into a crew, and lets no fitter make one', async () => {
    const body = newCrew('Borrowed', [shop.people.crew.personId]);
    expect((await callRoute(createCrewRoute, { cookie: otherOwner, body })).status).toBe(404);
    expect(await crews(otherOwner)).toEqual([]);
    expect((await callRoute(createCrewRoute, { cookie: crew, body })).status).toBe(403);
  });
});
