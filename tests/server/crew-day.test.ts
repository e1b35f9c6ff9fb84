import { randomUUID } from 'node:crypto';
import { and, eq, sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { audit, jobs, messages, signOffs, sites, visitPauses } from '@/db/schema';
import { asFoundAsks, asFoundReading } from '@/lib/days/as-found-asks';
import { onSiteMinutes } from '@/lib/days/on-site-minutes';
import { database } from '@/server/base/database';
import { getAccessCode } from '@/server/days/get-access-code';
import { getStop } from '@/server/days/get-stop';
import { recordDayEvents } from '@/server/days/record-day-events';
import { setForCrew } from '@/server/days/set-for-crew';
import { getJob } from '@/server/jobs/get-job';
import { closeSnag } from '@/server/snags/close-snag';
import { getSignOffCopy } from '@/server/snags/get-sign-off-copy';
import { listSignOffs } from '@/server/snags/list-sign-offs';
import { listSnags } from '@/server/snags/list-snags';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { type PutStop, putReleasedStop, putStop, signing, tap } from '../help/put-stop';
import { refusalOf } from '../help/refusal-of';

describe('a crew’s day as it reaches the office', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  const crew = (stop: PutStop) => contextOf(shop, 'crew', stop.now);
  const send = async (stop: PutStop, ...events: unknown[]) =>
    recordDayEvents(await crew(stop), { events });
  const stopOf = async (stop: PutStop) => getStop(await crew(stop), { visitId: stop.visit.id });
  const stageOf = async (stop: PutStop) =>
    (await getJob(await contextOf(shop, 'owner'), { jobId: stop.jobId })).stage;
  const snagged = (stop: PutStop, more: object = {}) =>
    tap(stop, 'snag', { words: 'Door of the sink base rubs', mender: 'crew', ...more });

  it('takes each tap once, however often it comes, and answers with its id', async () => {
    const stop = await putStop(shop);
    const events = [
      tap(stop, 'pause', { why: 'break' }),
      tap(stop, 'go-on', {}),
      tap(stop, 'check', { item: 'cables', answer: 'no', words: 'no finder in the van' }),
      snagged(stop),
    ];
    const first = await send(stop, ...events);
    expect(first).toEqual({ accepted: events.map(({ id }) => id), parked: [] });
    expect(await send(stop, ...events)).toEqual(first);
    const view = await stopOf(stop);
    expect(view.pauses.map(({ what }) => what)).toEqual(['pause', 'go-on']);
    expect(view.checks).toMatchObject([{ item: 'cables', answer: 'no' }]);
    expect(view.snags).toHaveLength(1);
    const { story } = await getJob(await contextOf(shop, 'owner'), { jobId: stop.jobId });
    expect(story.filter(({ summary }) => summary.includes('Looked for cables'))).toHaveLength(1);
  });

  it('takes what it understands and sends the rest back with why', async () => {
    const stop = await putStop(shop);
    const good = tap(stop, 'go-on', {});
    const bad = tap(stop, 'snag', { words: '', mender: 'crew' });
    const shut = tap(stop, 'close-snag', { snagId: randomUUID(), words: '', photoIds: [] });
    const stranger = tap(stop, 'close-snag', { snagId: randomUUID(), words: 'done' });
    expect(await send(stop, bad, shut, good, stranger)).toEqual({
      accepted: [good.id],
      parked: [
        { id: bad.id, message: 'Say what is not right.' },
        { id: shut.id, message: 'Say how it was mended, or take a photo of it.' },
        { id: stranger.id, message: 'There is no such snag in this shop.' },
      ],
    });
  });

  it('refuses an id that something else has, and leaves that as it was', async () => {
    const [one, other] = [await putStop(shop), await putStop(shop)];
    const pause = tap(one, 'pause', { why: 'parts' });
    await send(one, pause);
    const answer = await send(other, { ...pause, visitId: other.visit.id });
    expect(answer.parked).toHaveLength(1);
    const { db } = await database();
    const rows = await db.select().from(visitPauses).where(eq(visitPauses.id, pause.id));
    expect(rows).toMatchObject([{ visitId: one.visit.id, why: 'parts' }]);
  });

  it('counts the minutes on site without the pauses', () => {
    const at = (time: string) => `2027-03-01T${time}:00Z`;
    const day = { arrivedAt: at('08:00'), leftAt: at('16:30') };
    const pauses = [
      { what: 'go-on', at: at('12:30') },
      { what: 'pause', at: at('12:00') },
    ] as const;
    expect(onSiteMinutes({ ...day, pauses }, 0)).toBe(480);
    expect(
      onSiteMinutes({ ...day, pauses: [...pauses, { what: 'pause', at: at('16:00') }] }, 0),
    ).toBe(450);
    expect(onSiteMinutes({ ...day, arrivedAt: null, pauses }, 0)).toBe(0);
  });

  it('says which fillers change when a corner is not as it was released, and nothing when it is', async () => {
    const stop = await putReleasedStop(shop);
    const [sheet] = (await stopOf(stop)).sheets;
    if (!sheet) throw new Error('no sheet');
    const asks = asFoundAsks(sheet);
    const corner = asks.find(({ kind }) => kind === 'diagonal');
    if (corner?.kind !== 'diagonal') throw new Error('no corner is asked');
    const reading = (value: number) =>
      asFoundReading(corner, {
        id: randomUUID(),
        roomId: stop.kitchen.roomId,
        takenAt: stop.now.toISOString(),
        unit: 'mm',
        typed: String(value),
        setUpId: randomUUID(),
        value,
      });
    const found = (value: number) =>
      tap(stop, 'as-found', {
        releaseId: stop.releaseId,
        readings: [reading(value)],
        said: { disagreements: [], changes: [] },
      });
    await send(stop, found(corner.wasMm));
    await send(stop, found(corner.wasMm + 40));
    const [same, other] = (await stopOf(stop)).asFound;
    expect(same).toMatchObject({ disagreements: [], changes: [] });
    expect(other?.disagreements.join()).toContain(`Corner ${corner.corner}`);
    expect(other?.changes.join()).toMatch(/filler (left|right): .* (narrower|wider) at the front/);
  });

  it('freezes what was signed, with the snags of that moment; later ones stand apart', async () => {
    const stop = await putStop(shop);
    const open = snagged(stop);
    await send(stop, open);
    expect(await stageOf(stop)).toBe('snags');
    const { id, words, mender } = { ...open };
    const listed = { id, words, mender, kind: 'fault', place: 'Kitchen', dueOn: null };
    const signed = tap(stop, 'sign-off', { ...signing, snags: [listed] });
    expect((await send(stop, signed)).accepted).toEqual([signed.id]);
    expect(await stageOf(stop)).toBe('snags');
    const later = { ...snagged(stop), at: new Date(stop.now.getTime() + 1_000).toISOString() };
    const laterCrew = await contextOf(shop, 'crew', new Date(stop.now.getTime() + 60_000));
    await recordDayEvents(laterCrew, { events: [later] });
    const office = await contextOf(shop, 'scheduler', stop.now);
    const snags = await listSnags(office, { jobId: stop.jobId });
    expect(snags.find((snag) => snag.id === later.id)?.isAfterSignOff).toBe(true);
    expect(snags.find((snag) => snag.id === open.id)?.isAfterSignOff).toBe(false);
    const [record] = await listSignOffs(office, { jobId: stop.jobId });
    expect(record).toMatchObject({ name: 'Robin Testwood', isUntouched: true, snags: [listed] });
    for (const snag of snags) {
      await closeSnag(office, { snagId: snag.id, words: 'planed', photoIds: [] });
    }
    expect(await stageOf(stop)).toBe('signed-off');
  });

  it('signs a visit once, and the customer is told once with a copy', async () => {
    const stop = await putStop(shop);
    const signed = tap(stop, 'sign-off', signing);
    await send(stop, signed);
    await send(stop, signed);
    expect(await stageOf(stop)).toBe('signed-off');
    const again = await send(stop, tap(stop, 'sign-off', signing));
    expect(again.parked[0]?.message).toContain('signed already');
    const unknown = {
      id: randomUUID(),
      words: 'x',
      mender: 'crew',
      kind: 'fault',
      place: '',
      dueOn: null,
    };
    const other = await putStop(shop);
    const early = await send(other, tap(other, 'sign-off', { ...signing, snags: [unknown] }));
    expect(early.parked[0]?.message).toContain('not with the office');
    const { db } = await database();
    const told = await db
      .select({ channel: messages.channel })
      .from(messages)
      .where(and(eq(messages.visitId, stop.visit.id), eq(messages.occasion, 'done')));
    expect(told.map(({ channel }) => channel).sort()).toEqual(['email', 'sms']);
    const copy = await getSignOffCopy(await contextOf(shop, 'owner'), { signOffId: signed.id });
    expect(copy).toMatchObject({ mediaType: 'application/pdf', name: 'sign-off.pdf' });
    expect(copy.bytes).toBeGreaterThan(2_000);
  });

  it('lets nobody change a signature, and finds one out that was changed past the database', async () => {
    const stop = await putStop(shop);
    const signed = tap(stop, 'sign-off', signing);
    await send(stop, signed);
    const { db } = await database();
    const change = () =>
      db.update(signOffs).set({ name: 'Somebody else' }).where(eq(signOffs.id, signed.id));
    await expect(change()).rejects.toMatchObject({
      cause: { message: 'sign_offs is append-only' },
    });
    await expect(db.delete(signOffs).where(eq(signOffs.id, signed.id))).rejects.toThrow();
    await db.execute(sql`alter table sign_offs disable trigger sign_offs_frozen`);
    await change();
    await db.execute(sql`alter table sign_offs enable trigger sign_offs_frozen`);
    const [record] = await listSignOffs(await contextOf(shop, 'owner'), { jobId: stop.jobId });
    expect(record?.isUntouched).toBe(false);
  });

  it('opens an access code to its crew on the day alone, and writes each look down', async () => {
    const stop = await putStop(shop);
    const scheduler = await contextOf(shop, 'scheduler', stop.now);
    await setForCrew(scheduler, { jobId: stop.jobId, accessCode: '4471#', parking: 'in the lane' });
    const { db } = await database();
    const [job] = await db.select().from(jobs).where(eq(jobs.id, stop.jobId));
    const [site] = await db
      .select()
      .from(sites)
      .where(eq(sites.id, job?.siteId ?? ''));
    expect(site?.accessCodeSealed).toMatch(/^v1\./);
    expect(site?.accessCodeSealed).not.toContain('4471');

    const asked = { visitId: stop.visit.id };
    expect(await stopOf(stop)).toMatchObject({ hasAccessCode: true, parking: 'in the lane' });
    expect(await getAccessCode(await crew(stop), asked)).toMatchObject({ code: '4471#' });
    expect(await refusalOf(getAccessCode(scheduler, asked))).toMatchObject({ status: 404 });
    const bench = await contextOf(shop, 'bench', stop.now);
    expect(await refusalOf(getAccessCode(bench, asked))).toMatchObject({ status: 403 });
    for (const days of [-1, 1]) {
      const ctx = await contextOf(shop, 'crew', new Date(stop.now.getTime() + days * 86_400_000));
      expect(await refusalOf(getAccessCode(ctx, asked))).toMatchObject({ code: 'not-today' });
    }
    const look = tap(stop, 'code-seen', {});
    await send(stop, look, look);
    const lines = await db.select().from(audit).where(eq(audit.jobId, stop.jobId));
    expect(lines.filter(({ verb }) => verb === 'take-access-code')).toHaveLength(1);
    expect(lines.filter(({ verb }) => verb === 'see-access-code')).toHaveLength(1);
    expect(JSON.stringify(lines)).not.toContain('4471');
    const told = await db.select().from(messages).where(eq(messages.jobId, stop.jobId));
    expect(JSON.stringify(told)).not.toContain('4471');
    // Copied to another site it does not open.
    const other = await putStop(shop);
    const [otherJob] = await db.select().from(jobs).where(eq(jobs.id, other.jobId));
    await db
      .update(sites)
      .set({ accessCodeSealed: site?.accessCodeSealed })
      .where(eq(sites.id, otherJob?.siteId ?? ''));
    const moved = getAccessCode(await crew(other), { visitId: other.visit.id });
    expect(await refusalOf(moved)).toMatchObject({ code: 'code-lost' });
  });
});
