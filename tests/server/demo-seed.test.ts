import { and, count, eq, ne } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { audit, jobs, messages, people, rooms, shops, visits } from '@/db/schema';
import { seedDemo } from '@/db/seed/seed-demo';
import { stages } from '@/lib/schedule/stages';
import { localDate } from '@/lib/time/local-moment';
import { isWorkday } from '@/lib/time/workdays';
import type { PersonContext } from '@/server/base/context';
import { database } from '@/server/base/database';
import { log } from '@/server/base/log';
import { getJob } from '@/server/jobs/get-job';
import { listJobs } from '@/server/jobs/list-jobs';
import { getFit } from '@/server/sheets/get-fit';
import { getSignOffCopy } from '@/server/snags/get-sign-off-copy';
import { keepDemoSignOff } from '@/server/snags/keep-demo-sign-off';
import { listSignOffs } from '@/server/snags/list-sign-offs';
import { getWaitingList } from '@/server/visits/get-waiting-list';
import { makeVisitLink } from '@/server/visits/visit-link';

/** A Saturday evening, so that "today" is no day of work, three weeks after the clocks went back. */
const now = new Date('2026-11-22T01:30:00Z');

describe('the demo’s shop, seeded on a Saturday evening', () => {
  let ctx: PersonContext;
  const seed = async () =>
    seedDemo((await database()).db, {
      now,
      hashPassword: async (password) => `hash of ${password}`,
      linkVisit: (tx, { shopId, ...visit }) => makeVisitLink(tx, { shop: { id: shopId } }, visit),
      signOff: keepDemoSignOff,
    });

  beforeAll(async () => {
    await seed();
    const { db } = await database();
    const [shop] = await db
      .select()
      .from(shops)
      .where(eq(shops.name, 'Juniper Bend Cabinet Works'));
    const [owner] = shop
      ? await db
          .select()
          .from(people)
          .where(and(eq(people.shopId, shop.id), eq(people.role, 'owner')))
      : [];
    if (!shop || !owner) throw new Error('the demo has no shop');
    const actor = {
      kind: 'person',
      role: 'owner',
      personId: owner.id,
      userId: '',
      name: '',
    } as const;
    ctx = { shop, actor, db, now, log };
  }, 60_000);

  const roomOf = async (customer: string) => {
    const [row] = await ctx.db
      .select({ id: rooms.id, jobId: rooms.jobId })
      .from(rooms)
      .innerJoin(jobs, eq(jobs.id, rooms.jobId))
      .where(and(eq(rooms.shopId, ctx.shop.id), eq(jobs.id, await jobIdOf(customer))));
    if (!row) throw new Error(`${customer} has no room`);
    return row;
  };
  const jobIdOf = async (customer: string) => {
    const job = (await listJobs(ctx, { search: customer }))[0];
    if (!job) throw new Error(`there is no ${customer}`);
    return job.id;
  };

  it('has about forty jobs, and some at every stage', async () => {
    const list = await listJobs(ctx, { search: '' });
    expect(list.length).toBeGreaterThan(35);
    expect(new Set(list.map(({ stage }) => stage))).toEqual(new Set(stages));
  });

  it('is seeded once: a second start changes nothing', async () => {
    const before = await ctx.db.select({ count: count() }).from(jobs);
    await seed();
    expect(await ctx.db.select({ count: count() }).from(jobs)).toEqual(before);
  });

  it('books on worked days only, also when today is none', async () => {
    const starts = await ctx.db
      .select({ startsAt: visits.startsAt })
      .from(visits)
      .where(eq(visits.shopId, ctx.shop.id));
    const days = starts.map(({ startsAt }) => localDate(startsAt, ctx.shop.zone));
    expect(days.filter((day) => !isWorkday(day, ctx.shop.rules.booking))).toEqual([]);
  });

  it('waits for measures and installs that can be booked now, later and not yet', async () => {
    const list = await getWaitingList(ctx);
    expect(new Set(list.map(({ kind }) => kind))).toContain('site-measure');
    expect(new Set(list.map(({ kind }) => kind))).toContain('install');
    expect(new Set(list.map(({ state }) => state))).toEqual(new Set(['now', 'from', 'blocked']));
  });

  it('has a room nearly true, that no rule speaks against', async () => {
    const { fit } = await getFit(ctx, { roomId: (await roomOf('Noor Vale')).id });
    expect(fit.verdicts.filter(({ verdict }) => verdict === 'over')).toEqual([]);
    expect(fit.runs.map(({ fill }) => fill?.verdict)).toEqual(['fits', 'fits']);
  });

  it('has a room badly out, with corners and walls over their limits', async () => {
    const { fit } = await getFit(ctx, { roomId: (await roomOf('Ruth Ember')).id });
    const over = fit.verdicts.filter(({ verdict }) => verdict === 'over');
    expect(over.length).toBeGreaterThan(4);
  });

  it('has a room with one wall misread, and names that wall and by how much', async () => {
    const { fit } = await getFit(ctx, { roomId: (await roomOf('Piet Harrow')).id });
    expect(fit.closure.suspect?.words).toMatch(/^Wall C, length at the counter: 100 mm too long/);
  });

  it('tells each job’s story up to now, in order', async () => {
    const { story } = await getJob(ctx, { jobId: await jobIdOf('Mo Fairlie') });
    expect(story.map(({ summary }) => summary.replace(/ for .*/, ''))).toEqual([
      'The bench took up Kitchen, revision A',
      'Released Kitchen, revision A',
      'Measure: done',
      'Handed in the wall book of Kitchen',
      'Measure: arrived',
      'Measure: the customer says yes',
      'Measure booked',
      'Job 2425 started from a call',
    ]);
    expect(story.every(({ at }) => new Date(at) <= now)).toBe(true);
  });

  it('has signatures with their strokes under a seal that holds, told to nobody now', async () => {
    const jobId = await jobIdOf('Mae Bright');
    const [record, ...more] = await listSignOffs(ctx, { jobId });
    expect(more).toEqual([]);
    expect(record).toMatchObject({ name: 'Mae Bright', isUntouched: true, snags: [] });
    expect(record?.strokes.length).toBeGreaterThan(1);
    const copy = await getSignOffCopy(ctx, { signOffId: record?.id ?? '' });
    expect(copy.bytes).toBeGreaterThan(2_000);
    const { story, stage } = await getJob(ctx, { jobId });
    expect(stage).toBe('signed-off');
    expect(story[0]?.summary).toBe('Signed by Mae Bright, no snag open');
    const [open] = await listSignOffs(ctx, { jobId: await jobIdOf('Ivo Merrow') });
    expect(open?.snags).toHaveLength(2);
    const waiting = await ctx.db.select().from(messages).where(eq(messages.occasion, 'done'));
    expect(waiting).toEqual([]);
  });

  it('has a second shop that sees nothing of the first', async () => {
    const [other] = await ctx.db.select().from(shops).where(ne(shops.id, ctx.shop.id));
    if (!other) throw new Error('there is no second shop');
    expect(await listJobs({ ...ctx, shop: other }, { search: '' })).toEqual([]);
    const told = await ctx.db.select().from(audit).where(eq(audit.shopId, other.id));
    expect(told).toEqual([]);
  });
});
