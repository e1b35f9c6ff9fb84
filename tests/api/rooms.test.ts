import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as bookRoute } from '@/app/api/rooms/[roomId]/route';
import { POST as runsRoute } from '@/app/api/rooms/[roomId]/runs/route';
import { POST as submitRoute } from '@/app/api/rooms/[roomId]/submit/route';
import { GET as blankRoute } from '@/app/api/rooms/blank/route';
import { GET as listRoute, POST as saveRoute } from '@/app/api/rooms/route';
import type { RoomRow } from '@/lib/contracts/jobs';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Role } from '@/lib/permissions';
import { getJob } from '@/server/jobs/get-job';
import { recordReadings } from '@/server/walls/record-readings';
import { callRoute } from '../help/call-route';
import { crookedKitchen } from '../help/crooked-kitchen';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { lengthOn, type PutKitchen, putDrawnKitchen, putKitchen } from '../help/put-kitchen';
import { startTestJob } from '../help/start-test-job';

describe('rooms', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let kitchen: PutKitchen;
  const cookies = {} as Record<Role, string>;
  let otherCookie: string;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    kitchen = await putKitchen(shop);
    for (const role of ['scheduler', 'measurer', 'bench'] as const) {
      cookies[role] = await cookieOf(shop.people[role]);
    }
    otherCookie = await cookieOf(otherShop.people.owner);
  });

  const save = (jobId: string, room: unknown, cookie = cookies.measurer) =>
    callRoute(saveRoute, { cookie, body: { jobId, room } });
  const book = (roomId: string, cookie = cookies.measurer) =>
    callRoute(bookRoute, { method: 'GET', cookie, params: { roomId } });

  it('gives the phone the whole book, in the order in which it was read', async () => {
    const { status, body } = await book(kitchen.roomId);
    expect(status).toBe(200);
    const view = body as WallBookView;
    const { room, readings, tools } = kitchen.wallBook;
    expect(view.wallBook).toMatchObject({ room, readings });
    expect(view.wallBook.tools).toEqual(expect.arrayContaining(tools));
    expect(view.runs).toEqual(kitchen.runs);
    expect(view).toMatchObject({ jobId: kitchen.jobId, submittedAt: null });
    expect(view.rules).toEqual(shop.shop.rules.fit);
  });

  it('says who read what, so that two phones in one room can be told apart', async () => {
    const own = await putDrawnKitchen(shop);
    const [first, second] = [lengthOn(own, 0), lengthOn(own, 0, { valueMm: 3603 })];
    const by = (role: Role) => contextOf(shop, role, new Date());
    await recordReadings(await by('measurer'), { roomId: own.roomId, readings: [first] });
    await recordReadings(await by('crew'), { roomId: own.roomId, readings: [second] });
    const view = (await book(own.roomId)).body as WallBookView;
    expect(view.readers).toEqual([
      {
        personId: shop.people.measurer.personId,
        name: 'Measurer Test',
        readingIds: [first.id],
      },
      { personId: shop.people.crew.personId, name: 'Crew Test', readingIds: [second.id] },
    ]);
  });

  it('gives an empty book for a room that a phone may begin later, and writes nothing', async () => {
    const { jobId } = await startTestJob(shop);
    const roomId = randomUUID();
    const blank = (cookie = cookies.measurer) =>
      callRoute(blankRoute, {
        method: 'GET',
        url: `/api/rooms/blank?jobId=${jobId}&roomId=${roomId}`,
        cookie,
      });
    const { status, body } = await blank();
    expect(status).toBe(200);
    expect(body as WallBookView).toMatchObject({
      jobId,
      wallBook: { room: { id: roomId, chains: [] }, readings: [] },
      readers: [],
    });
    expect((await book(roomId)).status).toBe(404);
    expect((await blank(cookies.bench)).status).toBe(403);
    expect((await blank(otherCookie)).status).toBe(404);
  });

  it('lists the rooms of a job with what is read and laid out', async () => {
    const answer = await callRoute(listRoute, {
      method: 'GET',
      url: `/api/rooms?jobId=${kitchen.jobId}`,
      cookie: cookies.scheduler,
    });
    expect(answer.body as RoomRow[]).toMatchObject([
      {
        id: kitchen.roomId,
        name: 'Kitchen',
        wallCount: 4,
        readingCount: kitchen.wallBook.readings.length,
        runCount: 4,
        revision: null,
        isSuperseded: false,
      },
    ]);
  });

  it('lets walls change places and names while their readings stay', async () => {
    const { roomId, jobId, wallBook } = await putKitchen(shop);
    const [chain] = wallBook.room.chains;
    const walls = [...(chain?.walls ?? [])].reverse().map((wall, index) => ({
      ...wall,
      name: `W${index}`,
    }));
    const changed = { ...wallBook.room, chains: [{ closed: false, walls }] };
    expect((await save(jobId, changed)).status).toBe(200);
    const view = (await book(roomId)).body as WallBookView;
    expect(view.wallBook.room).toEqual(changed);
    expect(view.wallBook.readings).toHaveLength(wallBook.readings.length);
  });

  it('keeps a wall that a standing reading names, and lets it go when the reading is withdrawn', async () => {
    const { roomId, jobId, wallBook, ...rest } = await putDrawnKitchen(shop);
    const ctx = await contextOf(shop, 'measurer');
    const reading = lengthOn({ wallBook, ...rest }, 3);
    await recordReadings(ctx, { roomId, readings: [reading] });
    const [chain] = wallBook.room.chains;
    const withoutLast = {
      ...wallBook.room,
      chains: [{ closed: false, walls: chain?.walls.slice(0, 3) }],
    };
    const refusal = await save(jobId, withoutLast);
    expect(refusal.status).toBe(409);
    expect(refusal.body).toMatchObject({
      code: 'wall-in-use',
      title: expect.stringMatching(/Wall D/),
    });
    const withdrawal = {
      ...reading,
      id: randomUUID(),
      kind: 'withdrawal',
      readingId: reading.id,
      reason: 'drawn by mistake',
    };
    await recordReadings(ctx, { roomId, readings: [withdrawal] });
    expect((await save(jobId, withoutLast)).status).toBe(200);
  });

  it('keeps a wall that a run stands on', async () => {
    const { jobId, wallBook, roomId, runs } = await putDrawnKitchen(shop);
    const [run] = runs;
    await callRoute(runsRoute, {
      cookie: cookies.bench,
      params: { roomId },
      body: { runs: [run] },
    });
    const [chain] = wallBook.room.chains;
    const withoutFirst = {
      ...wallBook.room,
      chains: [{ closed: false, walls: chain?.walls.slice(1) }],
    };
    expect((await save(jobId, withoutFirst)).status).toBe(409);
  });

  it('refuses two walls of one name', async () => {
    const { jobId, wallBook } = await putDrawnKitchen(shop);
    const [chain] = wallBook.room.chains;
    const walls = chain?.walls.map((wall) => ({ ...wall, name: 'A' }));
    const answer = await save(jobId, { ...wallBook.room, chains: [{ closed: true, walls }] });
    expect(answer.status).toBe(422);
  });

  it('knows no room, job or wall of another shop or job', async () => {
    const { room } = crookedKitchen({ newId: randomUUID }).wallBook;
    expect((await save(kitchen.jobId, room, otherCookie)).status).toBe(404);
    expect((await book(kitchen.roomId, otherCookie)).status).toBe(404);
    const { jobId } = await startTestJob(otherShop);
    expect((await save(jobId, kitchen.wallBook.room, otherCookie)).status).toBe(404);
    const stolen = { ...kitchen.wallBook.room, id: randomUUID() };
    expect((await save(jobId, stolen, otherCookie)).status).toBe(404);
    const ofSameShop = await startTestJob(shop);
    expect((await save(ofSameShop.jobId, kitchen.wallBook.room)).status).toBe(404);
    const list = await callRoute(listRoute, {
      method: 'GET',
      url: `/api/rooms?jobId=${kitchen.jobId}`,
      cookie: otherCookie,
    });
    expect(list.status).toBe(404);
    const { room: drawn } = kitchen.wallBook;
    expect((await book(kitchen.roomId)).body).toMatchObject({ wallBook: { room: drawn } });
  });

  it('lets only those who measure draw a room', async () => {
    expect((await save(kitchen.jobId, kitchen.wallBook.room, cookies.bench)).status).toBe(403);
    expect(
      (await callRoute(bookRoute, { method: 'GET', params: { roomId: kitchen.roomId } })).status,
    ).toBe(401);
    expect(
      (await callRoute(listRoute, { method: 'GET', url: `/api/rooms?jobId=${kitchen.jobId}` }))
        .status,
    ).toBe(401);
  });

  describe('runs', () => {
    const saveRuns = (roomId: string, body: object, cookie = cookies.bench) =>
      callRoute(runsRoute, { cookie, params: { roomId }, body });

    it('puts the new runs and units in place of the old, in their order', async () => {
      const { roomId, runs } = await putKitchen(shop);
      const [first, second] = runs;
      const turned = [second, { ...first, units: [...(first?.units ?? [])].reverse() }];
      expect((await saveRuns(roomId, { runs: turned })).status).toBe(200);
      expect(((await book(roomId)).body as WallBookView).runs).toEqual(turned);
    });

    it('does not write over runs that somebody changed meanwhile', async () => {
      const { roomId, runs } = await putKitchen(shop);
      const first = await saveRuns(roomId, { runs: runs.slice(0, 2) });
      const { runsMark } = first.body as { runsMark: string };
      expect(
        (await saveRuns(roomId, { runs: runs.slice(0, 1), seenRunsMark: runsMark })).status,
      ).toBe(200);
      const late = await saveRuns(roomId, { runs, seenRunsMark: runsMark });
      expect(late.status).toBe(409);
      expect(late.body).toMatchObject({ code: 'runs-changed-meanwhile' });
      expect(((await book(roomId)).body as WallBookView).runs).toEqual(runs.slice(0, 1));
    });

    it('keeps one whole set of runs when two people save at the same moment', async () => {
      const { roomId, runs } = await putKitchen(shop);
      const other = runs.map((run) => ({
        ...run,
        id: randomUUID(),
        units: run.units.map((unit) => ({ ...unit, id: randomUUID() })),
      }));
      const answers = await Promise.all([
        saveRuns(roomId, { runs }),
        saveRuns(roomId, { runs: other }),
      ]);
      expect(answers.map(({ status }) => status)).toEqual([200, 200]);
      const kept = ((await book(roomId)).body as WallBookView).runs;
      expect([runs, other]).toContainEqual(kept);
    });

    it('says which field does not hold together and changes nothing', async () => {
      const { roomId, runs } = await putKitchen(shop);
      const [run] = runs;
      if (!run) throw new Error('the kitchen has no run');
      const wrong = [
        { ...run, wallId: randomUUID() },
        { ...run, right: { kind: 'run', runId: randomUUID(), through: 'this' } },
        { ...run, right: { kind: 'run', runId: run.id, through: 'this' } },
        { ...run, z1Mm: run.z0Mm },
        { ...run, share: { how: 'centred', unitId: randomUUID(), markMm: 900 } },
        { ...run, units: [...run.units, ...run.units] },
      ];
      for (const bad of wrong) {
        const answer = await saveRuns(roomId, { runs: [bad] });
        expect(answer.status).toBe(422);
        expect(Object.keys((answer.body as { errors: object }).errors)).not.toHaveLength(0);
      }
      expect(((await book(roomId)).body as WallBookView).runs).toEqual(runs);
    });

    it('refuses the id of a run in another room', async () => {
      const { roomId, wallBook } = await putDrawnKitchen(shop);
      const wallId = wallBook.room.chains[0]?.walls[0]?.id;
      const [theirs] = kitchen.runs;
      expect((await saveRuns(roomId, { runs: [{ ...theirs, wallId }] })).status).toBe(409);
    });

    it('is refused to a role that does not lay out runs, and to another shop', async () => {
      const { runs, roomId } = kitchen;
      expect((await saveRuns(roomId, { runs }, cookies.scheduler)).status).toBe(403);
      expect((await saveRuns(roomId, { runs }, otherCookie)).status).toBe(404);
    });
  });

  describe('handing in', () => {
    const submit = (roomId: string, cookie = cookies.measurer) =>
      callRoute(submitRoute, { cookie, params: { roomId } });

    it('moves the job to measured, and told twice changes nothing', async () => {
      const own = await putKitchen(shop);
      expect((await submit(own.roomId)).status).toBe(200);
      const first = (await book(own.roomId)).body as WallBookView;
      expect(first.submittedAt).not.toBeNull();
      const again = await submit(own.roomId);
      expect(again.body).toEqual({ submittedAt: first.submittedAt });
      const job = await getJob(await contextOf(shop, 'scheduler'), { jobId: own.jobId });
      expect(job.stage).toBe('measured');
      expect(job.story.filter(({ summary }) => summary.startsWith('Handed in'))).toHaveLength(1);
    });

    it('refuses an empty book', async () => {
      const { roomId } = await putDrawnKitchen(shop);
      expect((await submit(roomId)).status).toBe(422);
    });

    it('is refused to a role that does not measure, and to another shop', async () => {
      expect((await submit(kitchen.roomId, cookies.bench)).status).toBe(403);
      expect((await submit(kitchen.roomId, otherCookie)).status).toBe(404);
    });
  });
});
