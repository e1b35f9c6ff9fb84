import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as acceptRoute } from '@/app/api/slips/accept/route';
import { POST as previewRoute } from '@/app/api/slips/preview/route';
import { jobs, messages, visitPieces, visits } from '@/db/schema';
import { type AcceptSlipInput, acceptSlipInput, type SlipPreview } from '@/lib/contracts/slips';
import type { BookedVisit } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { acceptSlip } from '@/server/days/accept-slip';
import { previewSlip } from '@/server/days/preview-slip';
import { getFit } from '@/server/sheets/get-fit';
import { releaseSheet } from '@/server/sheets/release-sheet';
import { submitRoom } from '@/server/walls/submit-room';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { putKitchen } from '../help/put-kitchen';
import { refusalOf } from '../help/refusal-of';

/** Now is Tuesday 2026-12-01; both jobs are ready on Friday the 11th and are installed the week after. */
describe('a shop that is late', () => {
  let shop: TestShop;
  let crewId: string;
  let first: BookedVisit;
  let second: BookedVisit;
  let template: BookedVisit;
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop, 'fit'));
    const measure = await makeCrew(shop);
    const jobIds = [await readyJob(), await readyJob()];
    const [firstJob, secondJob] = jobIds;
    const install = { crewId, kind: 'install', workMinutes: 960, time: '08:00' } as const;
    first = await bookTestVisit(shop, { ...install, jobId: firstJob ?? '', date: '2026-12-14' });
    second = await bookTestVisit(shop, { ...install, jobId: secondJob ?? '', date: '2026-12-21' });
    template = await bookTestVisit(shop, {
      jobId: firstJob ?? '',
      crewId: measure.crewId,
      kind: 'worktop-template',
      date: '2026-12-16',
      time: '09:00',
    });
  });

  /** Measured, released, agreed, and ready on the 11th. */
  async function readyJob(): Promise<string> {
    const { jobId, roomId } = await putKitchen(shop);
    const ctx = await contextOf(shop, 'measurer', new Date('2026-11-02T15:00:00Z'));
    await submitRoom(ctx, { roomId });
    const { fit, runsMark } = await getFit(ctx, { roomId });
    await releaseSheet(ctx, {
      roomId,
      seenReadingIds: fit.readingIds,
      seenRunsMark: runsMark,
      overrideReason: 'a test',
    });
    const { db } = await database();
    await db
      .update(jobs)
      .set({ floorAgreed: true, readyOn: '2026-12-11' })
      .where(eq(jobs.id, jobId));
    return jobId;
  }
  const preview = async (days: number, jobIds = [first.jobId, second.jobId]) =>
    previewSlip(await contextOf(shop, 'scheduler'), { jobIds, days });
  const accept = async (input: AcceptSlipInput) =>
    acceptSlip(await contextOf(shop, 'scheduler'), input);
  const inputOf = (seen: SlipPreview): AcceptSlipInput =>
    acceptSlipInput.parse({
      idempotencyKey: randomUUID(),
      reason: 'the sprayer broke down',
      jobs: seen.jobs,
      moves: seen.moves.map(({ visitId, version, proposal }) => ({
        visitId,
        version,
        ...proposal,
      })),
    });
  async function diary() {
    const { db } = await database();
    const ofShop = eq(visits.shopId, shop.shop.id);
    return {
      visits: await db
        .select({ id: visits.id, version: visits.version, startsAt: visits.startsAt })
        .from(visits)
        .where(ofShop)
        .orderBy(visits.id),
      pieces: await db.$count(visitPieces, eq(visitPieces.shopId, shop.shop.id)),
      messages: await db.$count(messages, eq(messages.shopId, shop.shop.id)),
      ready: await db
        .select({ readyOn: jobs.readyOn })
        .from(jobs)
        .where(eq(jobs.shopId, shop.shop.id)),
    };
  }

  it('shows what moves, which gate it would break, and where it could go, and writes nothing', async () => {
    const before = await diary();
    const seen = await preview(3);
    expect(seen.jobs.map(({ readyOn }) => readyOn)).toEqual(['2026-12-16', '2026-12-16']);
    expect(seen.moves.map(({ visitId }) => visitId)).toEqual([first.id, template.id]);
    expect(seen.moves[0]?.brokenGates[0]).toBe('Not before Wed, Dec 16: cabinets ready.');
    // The next Monday is taken by the second install, so the same crew on another day.
    expect(seen.moves[0]?.proposal).toMatchObject({ crewId, date: '2026-12-28', time: '08:00' });
    expect(seen.moves[0]?.proposal?.why).toBe('same crew, same weekday, 14 days later, same hour');
    expect(seen.moves[1]?.proposal?.date.localeCompare('2026-12-29')).toBe(1);
    expect([seen.staying, seen.customersToTell]).toEqual([1, 1]);
    expect(await diary()).toEqual(before);
  });

  it('changes nothing at all when one of the visits was changed meanwhile', async () => {
    const input = inputOf(await preview(3));
    const before = await diary();
    const [one, ...others] = input.moves;
    if (!one) throw new Error('nothing moves');
    const stale = { ...input, moves: [...others, { ...one, version: one.version + 1 }] };
    expect(await refusalOf(accept(stale))).toMatchObject({ code: 'visit-changed' });
    const onTop = { ...input, moves: [...others, { ...one, date: '2026-12-22' }] };
    expect(await refusalOf(accept(onTop))).toMatchObject({ code: 'crew-already-booked' });
    const tooEarly = { ...input, moves: [{ ...one, date: '2026-12-15' }] };
    expect(await refusalOf(accept(tooEarly))).toMatchObject({ code: 'gate-not-passed' });
    expect(await diary()).toEqual(before);
  });

  it('is refused to a role that does not book, and knows no job of another shop', async () => {
    const bench = await cookieOf(shop.people.bench);
    const other = await cookieOf((await makeShop()).people.owner);
    const body = { jobIds: [first.jobId], days: 3 };
    const toAccept = {
      idempotencyKey: randomUUID(),
      reason: 'late',
      jobs: [{ jobId: first.jobId, readyOn: '2030-01-01' }],
      moves: [],
    };
    const answers = [
      await callRoute(previewRoute, { cookie: bench, body }),
      await callRoute(acceptRoute, { cookie: bench, body: toAccept }),
      await callRoute(previewRoute, { cookie: other, body }),
      await callRoute(acceptRoute, { cookie: other, body: toAccept }),
    ];
    expect(answers.map(({ status }) => status)).toEqual([403, 403, 404, 404]);
  });

  it('moves all at once when the scheduler agrees, and tells the customer of both visits once', async () => {
    const { db } = await database();
    const ofShop = eq(messages.shopId, shop.shop.id);
    await db
      .update(messages)
      .set({ state: 'sent' })
      .where(and(ofShop, eq(messages.occasion, 'booked')));
    const input = inputOf(await preview(3));
    const answer = await accept(input);
    expect(answer).toEqual({ moved: 2, customersTold: 1 });
    const after = await diary();
    expect(await accept(input)).toEqual(answer);
    expect(await diary()).toEqual(after);
    expect(after.ready).toEqual([{ readyOn: '2026-12-16' }, { readyOn: '2026-12-16' }]);
    const told = await db
      .select()
      .from(messages)
      .where(and(ofShop, eq(messages.occasion, 'moved')));
    for (const channel of ['sms', 'email']) {
      const notes = told.filter((note) => note.channel === channel);
      const lead = notes.find(({ toldWith }) => toldWith === null);
      expect(new Set(notes.map(({ visitId }) => visitId))).toEqual(
        new Set([first.id, template.id]),
      );
      expect(notes.filter((note) => note !== lead)).toMatchObject([{ toldWith: lead?.id }]);
    }
    expect((await preview(1, [second.jobId])).moves).toEqual([]);
  });
});
