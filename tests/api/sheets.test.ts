import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as benchRoute } from '@/app/api/bench/route';
import { GET as fitRoute } from '@/app/api/fits/route';
import { POST as takeUpRoute } from '@/app/api/sheets/[releaseId]/take-up/route';
import { POST as releaseRoute, GET as sheetRoute } from '@/app/api/sheets/route';
import { crews, releases, shops, visits } from '@/db/schema';
import type { BenchSheet } from '@/lib/contracts/bench';
import type { RoomRow } from '@/lib/contracts/jobs';
import type { FitView, SheetView } from '@/lib/contracts/rooms';
import { standingIds } from '@/lib/measure/standing-readings';
import type { Role } from '@/lib/permissions';
import { database } from '@/server/base/database';
import { refusedConstraint } from '@/server/base/database-refusal';
import { getJob } from '@/server/jobs/get-job';
import { getFit } from '@/server/sheets/get-fit';
import { releaseSheet } from '@/server/sheets/release-sheet';
import { sayReady } from '@/server/visits/say-ready';
import { listRooms } from '@/server/walls/list-rooms';
import { recordReadings } from '@/server/walls/record-readings';
import { saveRuns } from '@/server/walls/save-runs';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { lengthOn, type PutKitchen, putDrawnKitchen, putKitchen } from '../help/put-kitchen';

describe('sheets', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let kitchen: PutKitchen;
  const cookies = {} as Record<Role, string>;
  let otherCookie: string;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      cookies[role] = await cookieOf(shop.people[role]);
    }
    otherCookie = await cookieOf(otherShop.people.owner);
    kitchen = await putKitchen(shop);
  });

  async function fitOf(roomId: string, cookie = cookies.measurer) {
    const url = `/api/fits?roomId=${roomId}`;
    return callRoute(fitRoute, { method: 'GET', url, cookie });
  }
  async function sheetOf(roomId: string, revision: string, cookie = cookies.bench) {
    const url = `/api/sheets?roomId=${roomId}&revision=${revision}`;
    return callRoute(sheetRoute, { method: 'GET', url, cookie });
  }
  /** As the screen does it: what was seen goes with it. */
  async function release(roomId: string, change: object = {}, cookie = cookies.measurer) {
    const view = (await fitOf(roomId)).body as FitView;
    const body = {
      roomId,
      seenReadingIds: view.fit.readingIds,
      seenRunsMark: view.runsMark,
      overrideReason: 'customer agreed on the phone',
      ...change,
    };
    return callRoute(releaseRoute, { cookie, body });
  }
  async function readMore({ roomId, ...rest }: PutKitchen, ...places: number[]) {
    const list = places.map((place) => lengthOn({ ...rest }, place, { valueMm: 3600.45 }));
    const ctx = await contextOf(shop, 'measurer', new Date());
    return recordReadings(ctx, { roomId, readings: list });
  }
  const revisionOf = (answer: { body: unknown }) => (answer.body as { revision: string }).revision;

  it('works the fit out from what stands, and says who took each reading', async () => {
    const { status, body } = await fitOf(kitchen.roomId);
    expect(status).toBe(200);
    const view = body as FitView;
    expect(view.fit.readingIds).toEqual(standingIds(kitchen.wallBook.readings));
    expect(view.fit.runs.map(({ name }) => name)).toEqual(kitchen.runs.map(({ name }) => name));
    const [first] = kitchen.wallBook.readings;
    expect(view.takenBy[first?.id ?? '']).toMatch(/^Measurer Test, .*Dec 1/);
    expect(view).toMatchObject({ jobId: kitchen.jobId, releases: [], changesSinceRelease: null });
  });

  it('releases A, then B with what changed in words, and marks A as superseded', async () => {
    const own = await putKitchen(shop);
    const first = await release(own.roomId);
    expect(first.status).toBe(200);
    expect(revisionOf(first)).toBe('A');
    expect((await sheetOf(own.roomId, 'A')).body).toMatchObject({
      newerRevision: null,
      supersededBy: [],
      release: { revision: 'A', isSuperseded: false, releasedBy: 'Measurer Test', changes: [] },
    });

    const [sinkWall, ...others] = own.runs;
    if (!sinkWall) throw new Error('the kitchen has no run');
    const units = sinkWall.units.map((unit) =>
      unit.kind === 'sink' ? { ...unit, widthMm: 838.2 } : unit,
    );
    await saveRuns(await contextOf(shop, 'bench'), {
      roomId: own.roomId,
      runs: [{ ...sinkWall, units }, ...others],
    });
    const outdated = (await sheetOf(own.roomId, 'A')).body as SheetView;
    expect(outdated.supersededBy).toEqual(['Sink wall: sink 36" is now 33"']);
    expect(outdated.release.isSuperseded).toBe(true);
    const draft = (await fitOf(own.roomId)).body as FitView;
    expect(draft.changesSinceRelease?.[0]).toBe('Sink wall: sink 36" is now 33"');

    const second = await release(own.roomId);
    expect(revisionOf(second)).toBe('B');
    const older = (await sheetOf(own.roomId, 'A')).body as SheetView;
    expect(older).toMatchObject({ newerRevision: 'B', release: { isSuperseded: true } });
    const newer = (await sheetOf(own.roomId, 'B')).body as SheetView;
    expect(newer.release.changes[0]).toBe('Sink wall: sink 36" is now 33"');
    expect(newer.release.changes.some((line) => /filler left: blank .* is now/.test(line))).toBe(
      true,
    );
    expect(newer.supersededBy).toEqual([]);
    const sink = units.find(({ kind }) => kind === 'sink');
    expect(newer.revised?.revision).toBe('B');
    expect(newer.revised?.marks).toContainEqual({
      on: 'unit',
      runId: sinkWall.id,
      unitId: sink?.id,
      was: '36"',
    });
    expect(older.revised).toBeNull();
    const job = await getJob(await contextOf(shop, 'scheduler'), { jobId: own.jobId });
    expect(job.stage).toBe('released');
  });

  it('keeps a released sheet as it was, whatever is read, laid out or ruled later', async () => {
    const own = await putKitchen(shop);
    await release(own.roomId);
    const { db } = await database();
    const before = (await sheetOf(own.roomId, 'A')).body as SheetView;
    await readMore(own, 0, 1, 2, 3);
    await saveRuns(await contextOf(shop, 'bench'), { roomId: own.roomId, runs: [] });
    const [rules] = await db
      .select({ rules: shops.rules })
      .from(shops)
      .where(eq(shops.id, shop.shop.id));
    if (!rules) throw new Error('the shop has no rules');
    const changed = { ...rules.rules, fit: { ...rules.rules.fit, scribeMarginMm: 25 } };
    await db.update(shops).set({ rules: changed }).where(eq(shops.id, shop.shop.id));
    const after = (await sheetOf(own.roomId, 'A')).body as SheetView;
    await db.update(shops).set({ rules: rules.rules }).where(eq(shops.id, shop.shop.id));
    for (const part of ['wallBook', 'runs', 'rules', 'fit', 'engineVersion'] as const) {
      expect(after[part]).toEqual(before[part]);
    }
    expect(after.supersededBy).toHaveLength(8);
  });

  it('lets nobody change or remove a release in the database itself', async () => {
    const own = await putKitchen(shop);
    const { releaseId } = (await release(own.roomId)).body as { releaseId: string };
    const { db } = await database();
    const row = eq(releases.id, releaseId);
    const change = await db
      .update(releases)
      .set({ revision: 'Z' })
      .where(row)
      .then(() => null, refusedConstraint);
    const removal = await db
      .delete(releases)
      .where(row)
      .then(() => null, refusedConstraint);
    expect([change, removal]).toEqual(['releases_frozen', 'releases_frozen']);
  });

  it('refuses to release what the releaser did not see', async () => {
    const own = await putKitchen(shop);
    const view = (await fitOf(own.roomId)).body as FitView;
    const seen = { seenReadingIds: view.fit.readingIds, seenRunsMark: view.runsMark };
    await readMore(own, 2);
    const late = await release(own.roomId, seen);
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ code: 'changed-meanwhile' });
    await saveRuns(await contextOf(shop, 'bench'), { roomId: own.roomId, runs: own.runs.slice(1) });
    const stale = await release(own.roomId, { seenRunsMark: view.runsMark });
    expect(stale.body).toMatchObject({ code: 'changed-meanwhile' });
    expect(((await fitOf(own.roomId)).body as FitView).releases).toEqual([]);
  });

  it('releases nothing while the pieces of a wall do not add up, whatever the reason, and does once they are taken back', async () => {
    const own = await putKitchen(shop);
    const { kind: _kind, yMm: _yMm, valueMm, ...like } = lengthOn(own, 0);
    const whole = own.wallBook.readings.find(
      (one) => one.kind === 'length' && one.wallId === like.wallId && one.zMm === like.zMm,
    );
    const wholeMm = whole?.kind === 'length' ? whole.valueMm : valueMm;
    const pieces = { ...like, kind: 'pieces' as const, piecesMm: [1_000, wholeMm - 1_000 + 8] };
    const ctx = await contextOf(shop, 'measurer', new Date());
    await recordReadings(ctx, { roomId: own.roomId, readings: [pieces] });
    const refusal = await release(own.roomId);
    expect(refusal.status).toBe(422);
    expect(refusal.body).toMatchObject({ code: 'pieces-do-not-add-up' });
    expect((refusal.body as { current: string[] }).current[0]).toContain(
      'No release until the pieces add up.',
    );
    const takenBack = {
      ...like,
      id: randomUUID(),
      kind: 'withdrawal' as const,
      readingId: pieces.id,
      reason: 'Misread',
    };
    await recordReadings(ctx, { roomId: own.roomId, readings: [takenBack] });
    expect((await release(own.roomId)).status).toBe(200);
  });

  it('asks for a reason while something is open, and keeps it with the sheet', async () => {
    const own = await putKitchen(shop);
    const [sinkWall, ...others] = own.runs;
    if (!sinkWall) throw new Error('the kitchen has no run');
    const tooMuch = {
      ...sinkWall,
      units: sinkWall.units.map((unit) => ({ ...unit, widthMm: unit.widthMm + 25.4 })),
    };
    await saveRuns(await contextOf(shop, 'bench'), {
      roomId: own.roomId,
      runs: [tooMuch, ...others],
    });
    const refusal = await release(own.roomId, { overrideReason: '  ' });
    expect(refusal.status).toBe(422);
    expect(refusal.body).toMatchObject({
      code: 'reason-needed',
      errors: { overrideReason: 'Say why.' },
    });
    const open = (refusal.body as { current: string[] }).current;
    expect(open.some((line) => line.startsWith('Sink wall is short'))).toBe(true);
    expect((await release(own.roomId, { overrideReason: 'boxes are built' })).status).toBe(200);
    expect((await sheetOf(own.roomId, 'A')).body).toMatchObject({
      overrideReason: 'boxes are built',
    });
  });

  it('does not release a room without a run, nor the same sheet twice', async () => {
    const bare = await putDrawnKitchen(shop);
    expect((await release(bare.roomId)).body).toMatchObject({ code: 'no-runs' });
    const own = await putKitchen(shop);
    await release(own.roomId);
    const again = await release(own.roomId);
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ code: 'nothing-changed' });
  });

  it('gives one letter once when two release at the same moment', async () => {
    const own = await putKitchen(shop);
    const answers = await Promise.all([
      release(own.roomId),
      release(own.roomId),
      release(own.roomId),
    ]);
    const won = answers.filter(({ status }) => status === 200);
    expect(won).toHaveLength(1);
    expect(answers.filter(({ status }) => status === 409)).toHaveLength(2);
    expect(((await fitOf(own.roomId)).body as FitView).releases).toHaveLength(1);
  });

  it('tells the room list and the bench when a sheet is superseded', async () => {
    const own = await putKitchen(shop);
    await release(own.roomId);
    const roomOf = async (): Promise<RoomRow | undefined> =>
      (await listRooms(await contextOf(shop, 'crew'), { jobId: own.jobId }))[0];
    expect(await roomOf()).toMatchObject({ revision: 'A', isSuperseded: false });
    await readMore(own, 1);
    expect(await roomOf()).toMatchObject({ revision: 'A', isSuperseded: true });
    const bench = await callRoute(benchRoute, { method: 'GET', cookie: cookies.bench });
    expect((bench.body as BenchSheet[]).find(({ roomId }) => roomId === own.roomId)).toMatchObject({
      revision: 'A',
      isSuperseded: true,
      takenUpWords: null,
      needWords: null,
    });
  });

  describe('the bench', () => {
    const takeUp = (releaseId: string, cookie = cookies.bench) =>
      callRoute(takeUpRoute, { cookie, params: { releaseId } });

    it('takes the newest sheet up once, and the job goes into build', async () => {
      const own = await putKitchen(shop);
      const { releaseId } = (await release(own.roomId)).body as { releaseId: string };
      expect((await takeUp(releaseId)).status).toBe(200);
      const first = (await sheetOf(own.roomId, 'A')).body as SheetView;
      expect(first.release.takenUpWords).toMatch(/^Bench Test, /);
      expect((await takeUp(releaseId)).status).toBe(200);
      expect((await sheetOf(own.roomId, 'A')).body).toEqual(first);
      const job = await getJob(await contextOf(shop, 'bench'), { jobId: own.jobId });
      expect(job.stage).toBe('in-build');
      expect(
        job.story.filter(({ summary }) => summary.startsWith('The bench took up')),
      ).toHaveLength(1);
    });

    it('does not take up a sheet that a newer one has replaced', async () => {
      const own = await putKitchen(shop);
      const { releaseId } = (await release(own.roomId)).body as { releaseId: string };
      await readMore(own, 1);
      await release(own.roomId);
      const refusal = await takeUp(releaseId);
      expect(refusal.status).toBe(409);
      expect(refusal.body).toMatchObject({ code: 'sheet-superseded', current: { revision: 'B' } });
    });

    it('sees only sheets that are to be built, and none of another shop', async () => {
      const own = await putKitchen(shop);
      await release(own.roomId);
      const listed = async (cookie: string) => {
        const { body } = await callRoute(benchRoute, { method: 'GET', cookie });
        return (body as BenchSheet[]).map(({ roomId }) => roomId);
      };
      expect(await listed(cookies.bench)).toContain(own.roomId);
      expect(await listed(otherCookie)).not.toContain(own.roomId);
      const ctx = await contextOf(shop, 'bench');
      await sayReady(ctx, { jobId: own.jobId, readyOn: '2026-12-01' });
      const rows = (await callRoute(benchRoute, { method: 'GET', cookie: cookies.bench })).body;
      expect((rows as BenchSheet[]).find(({ roomId }) => roomId === own.roomId)).toMatchObject({
        readyOn: '2026-12-01',
      });
    });

    it('puts the sheet whose install comes first on top, and those without one last', async () => {
      const own = await makeShop();
      const cookie = await cookieOf(own.people.bench);
      const { db } = await database();
      const shopId = own.shop.id;
      const [crew] = await db
        .insert(crews)
        .values({ shopId, name: 'North', does: 'fit', colour: '1' })
        .returning({ id: crews.id });
      const ctx = await contextOf(own, 'owner', new Date());
      const rooms: string[] = [];
      for (const startsAt of [null, '2027-02-01T13:00:00Z', '2027-01-11T13:00:00Z']) {
        const put = await putKitchen(own);
        rooms.push(put.roomId);
        const { fit, runsMark: seenRunsMark } = await getFit(ctx, put);
        await releaseSheet(ctx, {
          roomId: put.roomId,
          seenReadingIds: fit.readingIds,
          seenRunsMark,
          overrideReason: 'as agreed',
        });
        if (!startsAt || !crew) continue;
        const from = new Date(startsAt);
        const until = new Date(from.getTime() + 3_600_000);
        await db.insert(visits).values({
          shopId,
          jobId: put.jobId,
          kind: 'install',
          crewId: crew.id,
          startsAt: from,
          endsAt: until,
          windowStartsAt: from,
          windowEndsAt: until,
          workMinutes: 60,
        });
      }
      const rows = (await callRoute(benchRoute, { method: 'GET', cookie })).body as BenchSheet[];
      expect(rows.map(({ roomId }) => roomId)).toEqual([...rooms].reverse());
      expect(rows.map(({ needWords }) => needWords)).toEqual(['Mon, Jan 11', 'Mon, Feb 1', null]);
    });

    it('refuses the other roles and the other shop', async () => {
      const own = await putKitchen(shop);
      const { releaseId } = (await release(own.roomId)).body as { releaseId: string };
      expect((await takeUp(releaseId, cookies.measurer)).status).toBe(403);
      expect((await takeUp(releaseId, otherCookie)).status).toBe(404);
      expect((await takeUp(randomUUID())).status).toBe(404);
    });
  });

  it('lets only those release who may, and shows another shop nothing', async () => {
    const { roomId } = kitchen;
    expect((await release(roomId, {}, cookies.bench)).status).toBe(403);
    expect((await release(roomId, {}, cookies.scheduler)).status).toBe(403);
    expect((await release(roomId, {}, otherCookie)).status).toBe(404);
    expect((await fitOf(roomId, otherCookie)).status).toBe(404);
    await release(roomId);
    expect((await sheetOf(roomId, 'A', otherCookie)).status).toBe(404);
    expect((await sheetOf(roomId, 'Q')).status).toBe(404);
    expect((await sheetOf(roomId, 'a-b')).status).toBe(422);
  });

  it('asks a stranger to sign in', async () => {
    const { roomId } = kitchen;
    const asked = [
      callRoute(fitRoute, { method: 'GET', url: `/api/fits?roomId=${roomId}` }),
      callRoute(sheetRoute, { method: 'GET', url: `/api/sheets?roomId=${roomId}&revision=A` }),
      callRoute(benchRoute, { method: 'GET' }),
    ];
    expect((await Promise.all(asked)).map(({ status }) => status)).toEqual([401, 401, 401]);
  });
});
