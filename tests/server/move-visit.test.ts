import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { messages, visitLinks, visitPieces, visits } from '@/db/schema';
import type { BookedVisit, MoveVisitInput } from '@/lib/contracts/visits';
import { moveVisitInput } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { moveVisit } from '@/server/visits/move-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('moving and calling off a visit', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  /** Minutes after the booking, so that the order of messages is the order of deeds. */
  const later = (minutes: number) =>
    new Date(Date.parse('2026-12-01T15:00:00Z') + minutes * 60_000);

  async function booked(): Promise<BookedVisit> {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    return bookTestVisit(shop, { jobId, crewId });
  }

  async function move(visit: BookedVisit, change: Partial<MoveVisitInput>, minutes = 1) {
    const { id: visitId, version, crewId } = visit;
    const input = moveVisitInput.parse({
      visitId,
      version,
      crewId,
      date: '2026-12-11',
      time: '13:00',
      ...change,
    });
    return moveVisit(await contextOf(shop, 'scheduler', later(minutes)), input);
  }

  async function callOff(visit: BookedVisit, version = visit.version) {
    const ctx = await contextOf(shop, 'scheduler', later(9));
    return callOffVisit(ctx, { visitId: visit.id, version, reason: 'The floor is not down.' });
  }

  /** Occasions by state, of one channel. */
  async function outbox(visitId: string, channel: 'sms' | 'email' = 'sms') {
    const { db } = await database();
    const rows = await db
      .select({ occasion: messages.occasion, state: messages.state, cause: messages.cause })
      .from(messages)
      .where(and(eq(messages.visitId, visitId), eq(messages.channel, channel)))
      .orderBy(messages.createdAt, messages.dueAt);
    return rows;
  }
  const inState = (rows: { occasion: string; state: string }[], state: string) =>
    rows.filter((row) => row.state === state).map(({ occasion }) => occasion);

  /** As if the worker had told it. */
  async function markSent(visitId: string, occasion: string) {
    const { db } = await database();
    await db
      .update(messages)
      .set({ state: 'sent', sentAt: later(0) })
      .where(and(eq(messages.visitId, visitId), eq(messages.occasion, occasion)));
  }

  async function confirm(visitId: string) {
    const { db } = await database();
    await db.update(visits).set({ status: 'confirmed' }).where(eq(visits.id, visitId));
  }

  it('un-confirms, withdraws what waits for the old time, and tells the new time once', async () => {
    const visit = await booked();
    await markSent(visit.id, 'booked');
    await confirm(visit.id);
    const moved = await move(visit, {});
    expect(moved).toMatchObject({
      status: 'booked',
      confirmedAt: null,
      version: 2,
      startsAt: '2026-12-11T18:00:00.000Z',
      windowStartsAt: '2026-12-11T18:00:00.000Z',
    });
    for (const channel of ['sms', 'email'] as const) {
      const rows = await outbox(visit.id, channel);
      expect(inState(rows, 'withdrawn')).toEqual(['please-confirm', 'asked-again', 'day-before']);
      expect(inState(rows, 'waiting')).toEqual([
        'moved',
        'please-confirm',
        'asked-again',
        'day-before',
      ]);
      expect(rows.find(({ occasion }) => occasion === 'moved')?.cause).toEqual({
        toldFrom: '2026-12-10T14:00:00.000Z',
        toldUntil: '2026-12-10T16:00:00.000Z',
      });
    }
  });

  it('books anew in words when the booking had not been told yet', async () => {
    const visit = await booked();
    await move(visit, {});
    const rows = await outbox(visit.id);
    expect(inState(rows, 'waiting')).toEqual([
      'booked',
      'please-confirm',
      'asked-again',
      'day-before',
    ]);
  });

  it('counts a second move from the time that the customer knows', async () => {
    const visit = await booked();
    await markSent(visit.id, 'booked');
    const once = await move(visit, {});
    await move(once, { date: '2026-12-14' }, 2);
    const rows = await outbox(visit.id);
    expect(rows.filter(({ occasion }) => occasion === 'moved')).toMatchObject([
      { state: 'withdrawn' },
      { state: 'waiting', cause: { toldFrom: '2026-12-10T14:00:00.000Z' } },
    ]);
  });

  it('tells nobody of another crew or an hour more, and keeps the confirmation', async () => {
    const visit = await booked();
    await confirm(visit.id);
    const { crewId } = await makeCrew(shop, 'measure', []);
    const same = { date: '2026-12-10', time: '09:00' };
    const moved = await move(visit, { ...same, crewId, workMinutes: 150 });
    expect(moved).toMatchObject({ status: 'confirmed', version: 2, crewId, workMinutes: 150 });
    expect(moved.pieces[0]?.endsAt).toBe('2026-12-10T16:30:00.000Z');
    expect(inState(await outbox(visit.id), 'waiting')).toEqual([
      'booked',
      'please-confirm',
      'asked-again',
      'day-before',
    ]);
  });

  it('refuses a stale move with the visit as it is now, and writes nothing', async () => {
    const visit = await booked();
    const moved = await move(visit, {});
    const before = await outbox(visit.id);
    const refusal = await refusalOf(move(visit, { date: '2026-12-15' }));
    expect(refusal).toMatchObject({
      status: 409,
      code: 'visit-changed',
      current: { id: visit.id, version: 2, startsAt: moved.startsAt },
    });
    expect(await refusalOf(callOff(visit))).toMatchObject({ code: 'visit-changed' });
    expect(await outbox(visit.id)).toEqual(before);
  });

  it('lets one of two schedulers win who move the same visit at once', async () => {
    const visit = await booked();
    const outcomes = await Promise.allSettled([
      move(visit, { time: '10:00' }),
      move(visit, { time: '14:00' }),
    ]);
    expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('moves within its own time, and not onto another visit', async () => {
    const visit = await booked();
    const { jobId } = await startTestJob(shop);
    const other = await bookTestVisit(shop, { jobId, crewId: visit.crewId, time: '13:00' });
    const shifted = await move(visit, { date: '2026-12-10', time: '09:30' });
    expect(shifted.startsAt).toBe('2026-12-10T14:30:00.000Z');
    const refusal = await refusalOf(move(shifted, { date: '2026-12-10', time: '12:00' }));
    expect(refusal).toMatchObject({
      code: 'crew-already-booked',
      current: { visitId: other.id },
    });
    expect((await outbox(visit.id)).length).toBeGreaterThan(0);
    const { db } = await database();
    const kept = await db
      .select({ startsAt: visitPieces.startsAt })
      .from(visitPieces)
      .where(eq(visitPieces.visitId, visit.id));
    expect(kept).toEqual([{ startsAt: new Date('2026-12-10T14:30:00Z') }]);
  });

  it('asks once about a gate that stands against a visit, not at every move', async () => {
    const { jobId } = await startTestJob(shop, { wallsReady: 'not-yet' });
    const { crewId } = await makeCrew(shop, 'measure', []);
    const overrideReason = 'Bare studs on purpose';
    const visit = await bookTestVisit(shop, { jobId, crewId, overrideReason });
    await move(visit, {});
  });

  it('keeps the link alive for as long after the new time', async () => {
    const visit = await booked();
    await move(visit, { date: '2027-02-01' });
    const { db } = await database();
    const [link] = await db
      .select({ endsAt: visitLinks.endsAt })
      .from(visitLinks)
      .where(eq(visitLinks.visitId, visit.id));
    expect(link?.endsAt.toISOString().slice(0, 10)).toBe('2027-03-03');
  });

  it('frees the time of a visit that is called off, and tells why to who knew of it', async () => {
    const visit = await booked();
    await markSent(visit.id, 'booked');
    const over = await callOff(visit);
    expect(over).toMatchObject({ status: 'called-off', pieces: [] });
    const rows = await outbox(visit.id);
    expect(inState(rows, 'waiting')).toEqual(['called-off']);
    expect(rows.find(({ occasion }) => occasion === 'called-off')?.cause).toEqual({
      toldFrom: '2026-12-10T14:00:00.000Z',
      toldUntil: '2026-12-10T16:00:00.000Z',
      reason: 'The floor is not down.',
    });
    await bookTestVisit(shop, { jobId: visit.jobId, crewId: visit.crewId });
    expect(await refusalOf(move(visit, { version: 2 }))).toMatchObject({
      code: 'visit-under-way-or-over',
    });
    expect(await refusalOf(callOff(visit, 2))).toMatchObject({ code: 'visit-over' });
  });

  it('says nothing of a visit that was called off before anybody heard of it', async () => {
    const visit = await booked();
    await callOff(visit);
    const rows = await outbox(visit.id);
    expect(new Set(rows.map(({ state }) => state))).toEqual(new Set(['withdrawn']));
  });
});
