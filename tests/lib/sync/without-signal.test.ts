import { describe, expect, it } from 'vitest';
import { assetNamesIn } from '@/lib/sync/asset-names';
import { pagePatienceMs } from '@/lib/sync/page-patience';
import { isPhonePage, phonePlaceOf } from '@/lib/sync/phone-pages';
import { readinessOf } from '@/lib/sync/readiness';

describe('pages that open without a signal', () => {
  it.each([
    ['/today', true],
    ['/today/1b4e', true],
    ['/walls/1b4e', true],
    ['/todays', false],
    ['/v/token', false],
    ['/diary', false],
    ['/api/today', false],
    ['/', false],
  ])('%s: %s', (pathname, isPhone) => {
    expect(isPhonePage(pathname)).toBe(isPhone);
  });

  it('are told by their address', () => {
    expect(phonePlaceOf('/today', '')).toEqual({ page: 'today', date: null });
    expect(phonePlaceOf('/today', '?on=2026-12-02')).toEqual({ page: 'today', date: '2026-12-02' });
    expect(phonePlaceOf('/today/v%201/', '')).toEqual({ page: 'visit', visitId: 'v 1' });
    expect(phonePlaceOf('/walls/r1', '?job=j1')).toEqual({
      page: 'walls',
      roomId: 'r1',
      jobId: 'j1',
    });
    expect(phonePlaceOf('/walls/r1/more', '')).toEqual({ page: 'unknown' });
    expect(phonePlaceOf('/walls', '')).toEqual({ page: 'unknown' });
    expect(phonePlaceOf('/walls/%E0%A4%A', '')).toMatchObject({ roomId: '%E0%A4%A' });
  });
});

describe('how long a page is waited for', () => {
  it('is the usual time, and short for a while after one did not come', () => {
    expect(pagePatienceMs(null, 1_000_000)).toBe(3_000);
    expect(pagePatienceMs(990_000, 1_000_000)).toBe(900);
    expect(pagePatienceMs(900_000, 1_000_000)).toBe(3_000);
  });
});

describe('what the built files name', () => {
  it('is found in a page’s list, in a script that loads others, and in a style', () => {
    expect(
      assetNamesIn(
        '{"chunks":["/_next/static/chunks/1a-b_c.js","/_next/static/chunks/1a-b_c.js"],"css":"static/chunks/x~1.css"}',
      ),
    ).toEqual(['static/chunks/1a-b_c.js', 'static/chunks/x~1.css']);
    expect(assetNamesIn('Promise.all(["static/chunks/2d.js"].map(e=>t.l(e)))')).toEqual([
      'static/chunks/2d.js',
    ]);
    expect(assetNamesIn('src:url(../media/work-sans.1f.woff2)format("woff2")')).toEqual([
      'static/media/work-sans.1f.woff2',
    ]);
  });

  it('leaves out maps and what lies elsewhere', () => {
    expect(assetNamesIn('//# sourceMappingURL=static/chunks/a.js.map "../chunks/b.js"')).toEqual(
      [],
    );
  });
});

describe('ready for no signal', () => {
  const kept = {
    isProgramKept: true,
    fetchedAt: '2026-12-01T12:00:00.000Z',
    visitCount: 3,
    roomIds: ['a', 'b'],
    keptRoomIds: new Set(['a', 'b', 'of yesterday']),
  };

  it('when program, visits and every wall book of the day are here', () => {
    expect(readinessOf(kept)).toMatchObject({ isReady: true });
    expect(readinessOf({ ...kept, roomIds: [], visitCount: 0 }).isReady).toBe(true);
  });

  it('not while one of them is missing, and says which', () => {
    expect(readinessOf({ ...kept, isProgramKept: false }).isReady).toBe(false);
    expect(readinessOf({ ...kept, fetchedAt: null }).isReady).toBe(false);
    expect(readinessOf({ ...kept, keptStopCount: kept.visitCount }).isReady).toBe(true);
    expect(readinessOf({ ...kept, keptStopCount: kept.visitCount - 1 }).isReady).toBe(false);
    const { isReady, lines } = readinessOf({ ...kept, keptRoomIds: new Set(['b']) });
    expect(isReady).toBe(false);
    expect(lines.filter(({ isKept }) => !isKept)).toEqual([
      { words: 'Wall books: 1 of 2', isKept: false },
    ]);
  });
});
