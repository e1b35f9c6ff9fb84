import { type SQL, sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as fileRoute } from '@/app/api/numbers/[figure]/route';
import type { Figure, FigureKey, NumbersView } from '@/lib/contracts/numbers';
import type { PersonContext } from '@/server/base/context';
import { getNumbers } from '@/server/numbers/get-numbers';
import { demoContext } from '../help/demo-context';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';

const now = new Date('2026-11-24T19:00:00Z');
const days = 90;

describe('the numbers of the demo’s shop', () => {
  let ctx: PersonContext;
  let numbers: NumbersView;
  beforeAll(async () => {
    ctx = await demoContext(now);
    numbers = await getNumbers(ctx, { days });
  }, 60_000);

  const figureOf = (key: FigureKey): Figure => {
    const figure = numbers.figures.find((one) => one.key === key);
    if (!figure) throw new Error(`there is no figure ${key}`);
    return figure;
  };
  /** Another way to the same figure: the database's own calendar and arithmetic. */
  async function rows<Row>(query: SQL): Promise<Row[]> {
    return ((await ctx.db.execute(query)) as unknown as { rows: Row[] }).rows;
  }
  const inPeriod = () => sql`
    v.shop_id = ${ctx.shop.id} and v.status not in ('held', 'called-off') and v.starts_at <= ${now.toISOString()}::timestamptz
    and (v.starts_at at time zone ${ctx.shop.zone})::date >= (${now.toISOString()}::timestamptz at time zone ${ctx.shop.zone})::date - ${days}::int`;

  it('agree on yeses before the day with a count by the database', async () => {
    const [slow] = await rows<{ yes: number; all: number }>(sql`
      select count(*)::int as all, count(*) filter (where v.confirmed_at <
        date_trunc('day', v.starts_at at time zone ${ctx.shop.zone}) at time zone ${ctx.shop.zone})::int as yes
      from visits v where ${inPeriod()}`);
    const figure = figureOf('confirmed-before');
    expect(slow?.all).toBeGreaterThan(10);
    expect(figure.outOf).toBe(slow?.all);
    expect(figure.value).toBeCloseTo((slow?.yes ?? 0) / (slow?.all ?? 1), 12);
  });

  it('agree on arrivals in the window', async () => {
    const [slow] = await rows<{ kept: number; all: number }>(sql`
      select count(*)::int as all,
        count(*) filter (where v.arrived_at between v.window_starts_at and v.window_ends_at)::int as kept
      from visits v where ${inPeriod()} and v.arrived_at is not null`);
    const figure = figureOf('in-the-window');
    expect(slow?.all).toBeGreaterThan(10);
    expect(figure.outOf).toBe(slow?.all);
    expect(figure.value).toBeCloseTo((slow?.kept ?? 0) / (slow?.all ?? 1), 12);
  });

  it('agree on hours worked, minute by minute', async () => {
    const visits = await rows<{ id: string; arrived: string; left: string; expected: number }>(sql`
      select v.id, v.arrived_at::text as arrived, v.left_at::text as left, v.work_minutes as expected
      from visits v where ${inPeriod()} and v.status = 'done' and v.left_at > v.arrived_at`);
    const pieces = await rows<{ visit: string; from: string; to: string }>(sql`
      select visit_id as visit, starts_at::text as from, ends_at::text as to from visit_pieces`);
    let minutes = 0;
    for (const visit of visits) {
      const own = pieces.filter(({ visit: id }) => id === visit.id);
      const [from, to] = [Date.parse(visit.arrived), Date.parse(visit.left)];
      for (let at = from; at < to; at += 60_000) {
        const begun = own.filter((piece) => Date.parse(piece.from) <= at);
        const isNight =
          begun.length > 0 &&
          begun.length < own.length &&
          begun.every((piece) => Date.parse(piece.to) <= at);
        if (!isNight) minutes += 1;
      }
    }
    const figure = figureOf('hours');
    expect(visits.length).toBeGreaterThan(10);
    expect(figure.value).toBeCloseTo(minutes / 60, 1);
    expect(figure.outOf).toBeCloseTo(
      visits.reduce((total, { expected }) => total + expected, 0) / 60,
      9,
    );
  });

  it('agree on the days from the enquiry to the first arrival', async () => {
    for (const [key, kind] of [
      ['days-to-measure', 'site-measure'],
      ['days-to-install', 'install'],
    ] as const) {
      const [slow] = await rows<{ middle: number | null; all: number }>(sql`
        select count(*)::int as all, percentile_cont(0.5) within group (order by took) as middle from (
          select extract(epoch from min(v.arrived_at) - j.created_at) / 86400.0 as took
          from visits v join jobs j on j.id = v.job_id
          where v.shop_id = ${ctx.shop.id} and v.kind = ${kind} and v.status in ('on-site', 'done')
          group by j.id, j.created_at
          having (min(v.arrived_at) at time zone ${ctx.shop.zone})::date
            >= (${now.toISOString()}::timestamptz at time zone ${ctx.shop.zone})::date - ${days}::int
        ) firsts`);
      const figure = figureOf(key);
      expect(slow?.all).toBeGreaterThan(2);
      expect(figure.outOf).toBe(slow?.all);
      expect(figure.value).toBeCloseTo(Math.max(0, Number(slow?.middle)), 6);
    }
  });

  it('agree on second trips', async () => {
    const [slow] = await rows<{ trips: number }>(sql`
      select count(*)::int as trips from visits v where ${inPeriod()} and (
        v.status = 'missed' or (v.status = 'done' and v.kind = 'return') or
        (v.status = 'done' and v.kind = 'site-measure' and exists (
          select 1 from visits w where w.job_id = v.job_id and w.kind = 'site-measure'
            and w.status = 'done' and w.starts_at < v.starts_at)))`);
    expect(figureOf('second-trips').value).toBe(slow?.trips);
  });

  it('open each figure to jobs of this shop', async () => {
    const known = new Set(
      (await rows<{ id: string }>(sql`select id from jobs where shop_id = ${ctx.shop.id}`)).map(
        ({ id }) => id,
      ),
    );
    const lines = numbers.figures.flatMap((figure) => figure.lines);
    expect(lines.length).toBeGreaterThan(20);
    expect(lines.filter(({ jobId }) => !known.has(jobId))).toEqual([]);
  });
});

describe('the numbers as a file', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });
  const ask = async (cookie: string) =>
    fileRoute(
      new Request('http://localhost:3000/api/numbers/hours?days=30', { headers: { cookie } }),
      { params: Promise.resolve({ figure: 'hours' }) },
    );

  it('are for the owner, and hold nothing of another shop', async () => {
    const answer = await ask(await cookieOf(shop.people.owner));
    expect(answer.status).toBe(200);
    expect((await answer.text()).trim().split('\r\n')).toHaveLength(1);
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      expect((await ask(await cookieOf(shop.people[role]))).status).toBe(403);
    }
  });
});
