import { beforeAll, describe, expect, it } from 'vitest';
import { GET as backRoute } from '@/app/api/rules/changes/[changeId]/route';
import { POST as previewRoute } from '@/app/api/rules/preview/route';
import { PATCH as changeRoute } from '@/app/api/rules/route';
import type { RulePreview } from '@/lib/contracts/rule-changes';
import { copyRuleSet, withLimit } from '@/lib/measure/rules/copy-rule-set';
import { PUBLISHED_RULE_SETS } from '@/lib/measure/rules/rule-sets';
import { listRuleChanges } from '@/server/shops/list-rule-changes';
import { submitRoom } from '@/server/walls/submit-room';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { putKitchen } from '../help/put-kitchen';

describe('a change of the shop’s rules', () => {
  let shop: TestShop;
  let owner: string;
  beforeAll(async () => {
    shop = await makeShop();
    owner = await cookieOf(shop.people.owner);
    const { roomId } = await putKitchen(shop, { crookedness: 1 });
    await submitRoom(await contextOf(shop, 'measurer'), { roomId });
  });
  const fitRules = () => shop.shop.rules.fit;
  const preview = async (body: unknown, cookie = owner) =>
    callRoute(previewRoute, { body, cookie });

  it('is shown with the rooms that come out otherwise, before anything is changed', async () => {
    const strict = { ...fitRules(), plumbFlagMm: 0.5, plumbSeriousMm: 1, ruleSet: 'shop' };
    const { status, body } = await preview({ fit: strict });
    expect(status).toBe(200);
    const { changes, rooms, roomsLookedAt } = body as RulePreview;
    expect(changes.map(({ label }) => label)).toContain('Plumb or bow: flag');
    expect(roomsLookedAt).toBe(1);
    expect(rooms[0]?.from).not.toBe(rooms[0]?.to);
    expect((await contextOf(shop, 'owner')).shop.rules.fit).toEqual(fitRules());
  });

  it('is no change where the phone is only written otherwise, and is refused where it is none', async () => {
    await callRoute(changeRoute, { method: 'PATCH', body: { phone: '2125550119' }, cookie: owner });
    const looked = await preview({ phone: '(212) 555-0119' });
    expect(looked.body).toMatchObject({ changes: [] });
    expect(await preview({ phone: '12' })).toMatchObject({
      status: 422,
      body: { errors: { phone: expect.any(String) } },
    });
  });

  it('is kept with who made it, and a copied rule set with it', async () => {
    const set = PUBLISHED_RULE_SETS[0];
    if (!set) throw new Error('there is no set');
    const own = withLimit(copyRuleSet(set, 'own-ours'), 0, 3);
    const body = { fit: { ...fitRules(), ruleSet: own.id, ownRuleSets: [own] } };
    expect((await callRoute(changeRoute, { method: 'PATCH', body, cookie: owner })).status).toBe(
      200,
    );
    const ctx = await contextOf(shop, 'owner');
    expect(ctx.shop.rules.fit.ruleSet).toBe('own-ours');
    const [line] = await listRuleChanges(ctx);
    expect(line?.who).toBe('Owner Test');
    expect(line?.changes.map(({ label }) => label)).toEqual([
      'Rule set',
      'The shop’s own rule sets',
    ]);
  });

  it('is put back by what the server says would undo it, and what came after stays', async () => {
    const ctx = await contextOf(shop, 'owner');
    const { booking } = ctx.shop.rules;
    const change = (body: unknown) =>
      callRoute(changeRoute, { method: 'PATCH', body, cookie: owner });
    await change({ booking: { ...booking, windowMinutes: 90 } });
    await change({ booking: { ...booking, windowMinutes: 90, dayStart: '07:00' } });
    const lines = await listRuleChanges(ctx);
    const line = lines.find(({ changes }) => changes[0]?.label === 'Arrival window');
    const back = await askBack(line?.id ?? '', owner);
    expect(back).toMatchObject({ status: 200 });
    expect((await change(back.body)).status).toBe(200);
    expect((await contextOf(shop, 'owner')).shop.rules.booking).toEqual({
      ...booking,
      dayStart: '07:00',
    });
    expect((await askBack(line?.id ?? '', await cookieOf(shop.people.scheduler))).status).toBe(403);
    const other = await makeShop();
    expect((await askBack(line?.id ?? '', await cookieOf(other.people.owner))).status).toBe(404);
  });

  const askBack = (changeId: string, cookie: string) =>
    callRoute(backRoute, { method: 'GET', params: { changeId }, cookie });

  it('is looked at and made by the owner alone', async () => {
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      expect((await preview({ fit: fitRules() }, await cookieOf(shop.people[role]))).status).toBe(
        403,
      );
    }
    const other = await makeShop();
    const { body } = await preview({ fit: fitRules() }, await cookieOf(other.people.owner));
    expect(body).toMatchObject({ rooms: [], roomsLookedAt: 0 });
  });
});
