import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { jobs, messages, visits } from '@/db/schema';
import { holdOpeningInput } from '@/lib/contracts/openings';
import { type BookedVisit, type MoveVisitInput, moveVisitInput } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { listItems } from '@/server/messages/list-items';
import { putItem } from '@/server/messages/scheduler-items';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { holdOpening } from '@/server/visits/hold-opening';
import { moveVisit } from '@/server/visits/move-visit';
import { noteYes } from '@/server/visits/note-yes';
import { takeHeldTime } from '@/server/visits/take-held-time';
import { undoVisitChange } from '@/server/visits/undo-visit-change';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('taking the last change of a visit back', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  const bookedAt = Date.parse('2026-12-01T15:00:00Z');
  const seconds = (count: number) => new Date(bookedAt + count * 1000);
  const scheduler = (at: Date) => contextOf(shop, 'scheduler', at);

  async function booked(): Promise<BookedVisit> {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    return bookTestVisit(shop, { jobId, crewId });
  }

  async function move(visit: BookedVisit, change: Partial<MoveVisitInput>, at: Date) {
    const { id: visitId, version, crewId } = visit;
    const input = { visitId, version, crewId, date: '2026-12-11', time: '13:00', ...change };
    return moveVisit(await scheduler(at), moveVisitInput.parse(input));
  }

  async function hold(input: {
    jobId: string;
    crewId: string;
    forVisitId?: string;
    date?: string;
  }) {
    return holdOpening(
      await scheduler(seconds(0)),
      holdOpeningInput.parse({
        idempotencyKey: randomUUID(),
        kind: 'site-measure',
        date: '2026-12-10',
        time: '09:00',
        ...input,
      }),
    );
  }

  async function heldOf(jobId: string) {
    const { db } = await database();
    return db
      .select({
        id: visits.id,
        holdEndsAt: visits.holdEndsAt,
        heldForVisitId: visits.heldForVisitId,
      })
      .from(visits)
      .where(and(eq(visits.jobId, jobId), eq(visits.status, 'held')));
  }

  async function undo(visit: { id: string; version: number }, at: Date) {
    return undoVisitChange(await scheduler(at), { visitId: visit.id, version: visit.version });
  }

  /** All that the worker could have sent by now, sent. */
  async function sendAll(visitId: string) {
    const { db } = await database();
    await db
      .update(messages)
      .set({ state: 'sent' })
      .where(and(eq(messages.visitId, visitId), eq(messages.state, 'waiting')));
  }

  async function waiting(visitId: string) {
    const { db } = await database();
    const rows = await db
      .select({ occasion: messages.occasion })
      .from(messages)
      .where(
        and(
          eq(messages.visitId, visitId),
          eq(messages.channel, 'sms'),
          eq(messages.state, 'waiting'),
        ),
      );
    return rows
      .map(({ occasion }) => occasion)
      .filter((occasion) => ['booked', 'moved', 'called-off'].includes(occasion));
  }

  async function say(visit: BookedVisit, change: Partial<typeof visits.$inferInsert>) {
    const { db } = await database();
    await db.update(visits).set(change).where(eq(visits.id, visit.id));
  }

  it('puts a moved visit back with the customer’s yes, and sends nobody anything', async () => {
    const visit = await booked();
    await sendAll(visit.id);
    await say(visit, { status: 'confirmed', confirmedAt: seconds(1) });
    const moved = await move(visit, {}, seconds(60));
    expect(moved.status).toBe('booked');
    const back = await undo(moved, seconds(66));
    expect(back).toMatchObject({
      status: 'confirmed',
      startsAt: visit.startsAt,
      endsAt: visit.endsAt,
      windowWords: visit.windowWords,
      version: moved.version + 1,
    });
    expect(back.pieces.map(({ startsAt }) => startsAt)).toEqual([visit.startsAt]);
    expect(await waiting(visit.id)).toEqual([]);
  });

  it('tells the customer of the way back when the move had gone out, and asks for a yes again', async () => {
    const visit = await booked();
    await sendAll(visit.id);
    await say(visit, { status: 'confirmed', confirmedAt: seconds(1) });
    const moved = await move(visit, {}, seconds(60));
    await sendAll(visit.id);
    const back = await undo(moved, seconds(100));
    expect(back).toMatchObject({ status: 'booked', confirmedAt: null, startsAt: visit.startsAt });
    expect(await waiting(visit.id)).toEqual(['moved']);
  });

  it('lets a booking that nobody heard of yet wait again, its crew free', async () => {
    const visit = await booked();
    const off = await undo(visit, seconds(8));
    expect(off).toMatchObject({ status: 'called-off', pieces: [] });
    expect(await waiting(visit.id)).toEqual([]);
    const { jobId } = await startTestJob(shop);
    await expect(bookTestVisit(shop, { jobId, crewId: visit.crewId })).resolves.toBeTruthy();
  });

  it('lets a visit that was called off stand again, and nobody hears of either', async () => {
    const visit = await booked();
    await sendAll(visit.id);
    const off = await callOffVisit(await scheduler(seconds(60)), {
      visitId: visit.id,
      version: visit.version,
      reason: 'The wrong one.',
    });
    const back = await undo(off, seconds(65));
    expect(back).toMatchObject({ status: 'booked', startsAt: visit.startsAt });
    expect(back.pieces).toHaveLength(1);
    expect(await waiting(visit.id)).toEqual([]);
  });

  it('says again that it is booked to whom the calling off had reached', async () => {
    const visit = await booked();
    await sendAll(visit.id);
    const off = await callOffVisit(await scheduler(seconds(60)), {
      visitId: visit.id,
      version: visit.version,
      reason: 'The wrong one.',
    });
    await sendAll(visit.id);
    await undo(off, seconds(90));
    expect(await waiting(visit.id)).toEqual(['booked']);
  });

  it('holds a time again whose taking is taken back, for what is left of its quarter of an hour', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    const held = await hold({ jobId, crewId });
    const taken = await takeHeldTime(await scheduler(seconds(120)), { visitId: held.id });
    const off = await undo(taken, seconds(126));
    expect(off).toMatchObject({ status: 'called-off', pieces: [], isHeldAgain: true });
    expect(await waiting(taken.id)).toEqual([]);
    const [again] = await heldOf(jobId);
    expect(again?.holdEndsAt?.toISOString()).toBe(held.holdEndsAt);
    const other = bookTestVisit(shop, { ...(await startTestJob(shop)), crewId }, seconds(130));
    expect(await refusalOf(other)).toMatchObject({ code: 'crew-already-booked' });
    const retaken = await takeHeldTime(await scheduler(seconds(140)), { visitId: again?.id ?? '' });
    expect(retaken).toMatchObject({ status: 'booked', startsAt: held.startsAt });
  });

  it('puts a visit back that went to a held time, and holds that time for it again', async () => {
    const visit = await booked();
    await sendAll(visit.id);
    await say(visit, { status: 'confirmed', confirmedAt: seconds(1) });
    const { jobId, crewId, id: forVisitId } = visit;
    await hold({ jobId, crewId, forVisitId, date: '2026-12-14' });
    const [before] = await heldOf(jobId);
    const taken = await takeHeldTime(await scheduler(seconds(60)), { visitId: before?.id ?? '' });
    const back = await undo(taken, seconds(65));
    expect(back).toMatchObject({
      status: 'confirmed',
      startsAt: visit.startsAt,
      isHeldAgain: true,
    });
    expect(await waiting(visit.id)).toEqual([]);
    expect(await heldOf(jobId)).toMatchObject([{ heldForVisitId: visit.id }]);
  });

  it('holds nothing again once the quarter of an hour is over', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    const held = await hold({ jobId, crewId });
    const taken = await takeHeldTime(await scheduler(seconds(895)), { visitId: held.id });
    expect(await undo(taken, seconds(902))).toMatchObject({ isHeldAgain: false });
    expect(await heldOf(jobId)).toEqual([]);
  });

  it('takes back a yes that was noted of the wrong customer: what it had settled waits again', async () => {
    const visit = await booked();
    const { db } = await database();
    const [job] = await db.select().from(jobs).where(eq(jobs.id, visit.jobId));
    const customerId = job?.customerId ?? '';
    await db.transaction((tx) =>
      putItem(tx, {
        shopId: shop.shop.id,
        customerId,
        jobId: visit.jobId,
        visitId: visit.id,
        kind: 'no-answer',
        key: `no-answer:${visit.id}`,
        words: 'No answer yet.',
        at: seconds(30),
      }),
    );
    const open = async () => (await listItems(await scheduler(seconds(70)), { customerId })).length;
    const before = await waiting(visit.id);
    const said = await noteYes(await scheduler(seconds(60)), { visitId: visit.id, version: 1 });
    expect(said.status).toBe('confirmed');
    expect(await open()).toBe(0);
    const back = await undo(said, seconds(66));
    expect(back).toMatchObject({ status: 'booked', confirmedAt: null, startsAt: visit.startsAt });
    expect(await open()).toBe(1);
    expect(await waiting(visit.id)).toEqual(before);
  });

  it('is refused when the freed time was taken meanwhile, and leaves the visit called off', async () => {
    const visit = await booked();
    const off = await callOffVisit(await scheduler(seconds(60)), {
      visitId: visit.id,
      version: visit.version,
      reason: 'The wrong one.',
    });
    const { jobId } = await startTestJob(shop);
    await bookTestVisit(shop, { jobId, crewId: visit.crewId }, seconds(62));
    const refusal = await refusalOf(undo(off, seconds(65)));
    expect(refusal).toMatchObject({ status: 409, code: 'crew-already-booked' });
    const { db } = await database();
    const [row] = await db.select().from(visits).where(eq(visits.id, visit.id));
    expect(row).toMatchObject({ status: 'called-off', version: off.version });
  });

  it('takes back no other version, nothing after two minutes, and nothing of somebody else', async () => {
    const visit = await booked();
    const moved = await move(visit, {}, seconds(60));
    expect(await refusalOf(undo(visit, seconds(61)))).toMatchObject({ code: 'visit-changed' });
    expect(await refusalOf(undo(moved, seconds(200)))).toMatchObject({ code: 'too-late-to-undo' });
    const owner = await contextOf(shop, 'owner', seconds(62));
    const byOwner = undoVisitChange(owner, { visitId: moved.id, version: moved.version });
    expect(await refusalOf(byOwner)).toMatchObject({ code: 'too-late-to-undo' });
  });

  it('takes nothing back twice', async () => {
    const visit = await booked();
    const back = await undo(await move(visit, {}, seconds(60)), seconds(61));
    expect(await refusalOf(undo(back, seconds(62)))).toMatchObject({ code: 'too-late-to-undo' });
  });

  it('tells who was too late what was changed, by whom and when', async () => {
    const visit = await booked();
    await move(visit, {}, seconds(60));
    const refusal = await refusalOf(move(visit, { date: '2026-12-14' }, seconds(90)));
    expect(refusal).toMatchObject({
      code: 'visit-changed',
      current: { lastChange: { by: expect.any(String), atWords: 'today at 10:01 AM' } },
    });
  });
});
