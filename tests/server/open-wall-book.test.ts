import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as startJobRoute } from '@/app/api/jobs/route';
import { chainsOfShape } from '@/lib/walls-pad/room-shapes';
import { openWallBook } from '@/server/walls/open-wall-book';
import { saveRoom } from '@/server/walls/save-room';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';

describe('opening a wall book on the phone', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let jobId: string;

  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    const cookie = await cookieOf(shop.people.scheduler);
    const answer = await callRoute(startJobRoute, {
      cookie,
      body: {
        customer: { name: 'Ada Example' },
        site: { street: '1 Test Row' },
        title: 'Kitchen, L',
      },
    });
    jobId = (answer.body as { id: string }).id;
  });

  it('begins an empty one for a room of the job that nobody has drawn', async () => {
    const ctx = await contextOf(shop, 'measurer');
    const roomId = randomUUID();
    const view = await openWallBook(ctx, { roomId, jobId });
    expect(view).toMatchObject({
      jobId,
      jobTitle: 'Kitchen, L',
      customerName: 'Ada Example',
      wallBook: { room: { id: roomId, chains: [] }, readings: [] },
      submittedAt: null,
    });
    expect(view.rules.unit).toBe('in');
  });

  it('opens the room once it is drawn, with or without the job', async () => {
    const ctx = await contextOf(shop, 'crew');
    const room = {
      id: randomUUID(),
      name: 'Kitchen',
      chains: chainsOfShape('l', randomUUID),
      wallThicknessToComeMm: 0,
      floorToComeMm: 0,
    };
    await saveRoom(ctx, { jobId, room });
    for (const asked of [{ roomId: room.id }, { roomId: room.id, jobId }]) {
      const view = await openWallBook(ctx, asked);
      expect(view.wallBook.room).toEqual(room);
      expect(view.missing.length).toBeGreaterThan(0);
    }
  });

  it('finds no unknown room without its job', async () => {
    const ctx = await contextOf(shop, 'measurer');
    await expect(openWallBook(ctx, { roomId: randomUUID() })).rejects.toMatchObject({
      refusal: { status: 404 },
    });
  });

  it('begins nothing on another shop’s job', async () => {
    const ctx = await contextOf(otherShop, 'measurer');
    await expect(openWallBook(ctx, { roomId: randomUUID(), jobId })).rejects.toMatchObject({
      refusal: { status: 404 },
    });
  });

  it('refuses a role that does not measure', async () => {
    const ctx = await contextOf(shop, 'scheduler');
    await expect(openWallBook(ctx, { roomId: randomUUID(), jobId })).rejects.toMatchObject({
      refusal: { status: 403 },
    });
  });
});
