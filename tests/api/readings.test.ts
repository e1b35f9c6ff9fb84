import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as readingsRoute } from '@/app/api/readings/route';
import { readings } from '@/db/schema';
import type { Reading } from '@/lib/contracts/readings';
import type { RecordReadingsAnswer } from '@/lib/contracts/rooms';
import { standingIds } from '@/lib/measure/standing-readings';
import { database } from '@/server/base/database';
import { refusedConstraint } from '@/server/base/database-refusal';
import { getWallBook } from '@/server/walls/get-wall-book';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { lengthOn, type PutKitchen, putDrawnKitchen } from '../help/put-kitchen';

describe('readings', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let kitchen: PutKitchen;
  let measurer: string;
  let crew: string;
  let otherCookie: string;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    kitchen = await putDrawnKitchen(shop);
    measurer = await cookieOf(shop.people.measurer);
    crew = await cookieOf(shop.people.crew);
    otherCookie = await cookieOf(otherShop.people.owner);
  });

  async function send(list: unknown[], to = kitchen.roomId, cookie = measurer) {
    const answer = await callRoute(readingsRoute, { cookie, body: { roomId: to, readings: list } });
    return { status: answer.status, ...(answer.body as RecordReadingsAnswer) };
  }

  async function bookOf({ roomId }: PutKitchen): Promise<Reading[]> {
    return (await getWallBook(await contextOf(shop, 'measurer'), { roomId })).wallBook.readings;
  }

  it('keeps what it accepted as it was sent, under who took it', async () => {
    const reading = lengthOn(kitchen, 0, { typed: '141 3/4' });
    expect(await send([reading], kitchen.roomId, crew)).toMatchObject({
      status: 200,
      accepted: [reading.id],
      parked: [],
    });
    const { db } = await database();
    const [row] = await db.select().from(readings).where(eq(readings.id, reading.id));
    expect(row).toMatchObject({
      body: reading,
      takenBy: shop.people.crew.personId,
      kind: 'length',
    });
    expect(row?.takenAt.toISOString()).toBe(reading.takenAt);
  });

  it('accepts a reading that is sent again and changes nothing, whoever sends it', async () => {
    const reading = lengthOn(kitchen, 1);
    const before = (await bookOf(kitchen)).length;
    for (const cookie of [measurer, measurer, crew]) {
      expect((await send([reading, reading], kitchen.roomId, cookie)).accepted).toEqual([
        reading.id,
        reading.id,
      ]);
    }
    expect(await bookOf(kitchen)).toHaveLength(before + 1);
    const { db } = await database();
    const [row] = await db
      .select({ takenBy: readings.takenBy })
      .from(readings)
      .where(eq(readings.id, reading.id));
    expect(row?.takenBy).toBe(shop.people.measurer.personId);
  });

  it('parks an id that is known with other content, and keeps the first', async () => {
    const reading = lengthOn(kitchen, 1, { valueMm: 2860 });
    await send([reading]);
    const answer = await send([{ ...reading, valueMm: 2885.4 }]);
    expect(answer.accepted).toEqual([]);
    expect(answer.parked).toMatchObject([{ id: reading.id }]);
    expect((await bookOf(kitchen)).find(({ id }) => id === reading.id)).toEqual(reading);
  });

  it('parks what it does not understand alone and takes the rest in order', async () => {
    const own = await putDrawnKitchen(shop);
    const good = [lengthOn(own, 0), lengthOn(own, 1), lengthOn(own, 2)];
    const bad = [
      { ...lengthOn(own, 0), valueMm: -5 },
      { ...lengthOn(own, 0), kind: 'guess' },
      { ...lengthOn(own, 0), typed: 'NUL \0' },
      { ...lengthOn(own, 0), typed: 'half a pair \ud83d' },
      lengthOn(kitchen, 0),
      null,
      'ninety',
      [],
    ];
    const answer = await send(
      [bad[0], good[0], ...bad.slice(1, 4), good[1], ...bad.slice(4), good[2]],
      own.roomId,
    );
    expect(answer.status).toBe(200);
    expect(answer.accepted).toEqual(good.map(({ id }) => id));
    expect(answer.parked).toHaveLength(bad.length);
    expect(answer.parked.every(({ message }) => message.length > 0)).toBe(true);
    expect(await bookOf(own)).toEqual(good);
  });

  it('takes 200 readings at once and gives them back in their order', async () => {
    const own = await putDrawnKitchen(shop);
    const list = Array.from({ length: 200 }, (_, index) =>
      lengthOn(own, index % 4, { valueMm: 2000 + index * 1.5875 }),
    );
    expect((await send(list, own.roomId)).accepted).toEqual(list.map(({ id }) => id));
    expect(await bookOf(own)).toEqual(list);
  });

  it('takes readings that arrive out of order, a correction before what it corrects', async () => {
    const own = await putDrawnKitchen(shop);
    const first = lengthOn(own, 0, { takenAt: '2026-12-01T09:00:00.000Z', valueMm: 3625.85 });
    const second = lengthOn(own, 0, {
      takenAt: '2026-12-01T09:01:00.000Z',
      replaces: first.id,
    });
    await send([second], own.roomId);
    await send([first], own.roomId);
    const book = await bookOf(own);
    expect(book.map(({ id }) => id)).toEqual([second.id, first.id]);
    expect(book[0]).toMatchObject({ replaces: first.id });
    expect(standingIds(book)).toEqual([second.id]);
  });

  it('keeps a withdrawn reading in the book, marked by its withdrawal', async () => {
    const own = await putDrawnKitchen(shop);
    const reading = lengthOn(own, 0);
    const { wallId: _wallId, zMm: _zMm, yMm: _yMm, valueMm: _valueMm, ...common } = reading;
    const withdrawal = {
      ...common,
      id: randomUUID(),
      kind: 'withdrawal' as const,
      readingId: reading.id,
      reason: 'the tape had slipped',
    };
    await send([reading, withdrawal], own.roomId);
    expect(await bookOf(own)).toEqual([reading, withdrawal]);
    expect(standingIds(await bookOf(own))).toEqual([]);
  });

  it('parks the id of a reading in another shop without a word of it', async () => {
    const theirs = await putDrawnKitchen(otherShop);
    const secret = lengthOn(theirs, 0, { typed: 'secret' });
    await send([secret], theirs.roomId, otherCookie);
    const answer = await send([lengthOn(kitchen, 0, { id: secret.id })]);
    expect(answer.parked).toMatchObject([{ id: secret.id }]);
    expect(JSON.stringify(answer)).not.toContain('secret');
  });

  it('is refused to a role that does not measure, to another shop and to strangers', async () => {
    const body = { roomId: kitchen.roomId, readings: [lengthOn(kitchen, 0)] };
    const bench = await cookieOf(shop.people.bench);
    expect((await callRoute(readingsRoute, { cookie: bench, body })).status).toBe(403);
    expect((await callRoute(readingsRoute, { cookie: otherCookie, body })).status).toBe(404);
    expect((await callRoute(readingsRoute, { body })).status).toBe(401);
  });

  it('lets nobody change a reading in the database itself', async () => {
    const reading = lengthOn(kitchen, 2);
    await send([reading]);
    const { db } = await database();
    const refusal = await db
      .update(readings)
      .set({ kind: 'corner' })
      .where(eq(readings.id, reading.id))
      .then(() => null, refusedConstraint);
    expect(refusal).toBe('readings_append_only');
  });
});
