import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as healthRoute } from '@/app/api/health/route';
import type { OpenDatabase } from '@/db/database';
import { database, setDatabase } from '@/server/base/database';
import { callRoute } from '../help/call-route';

describe('health', () => {
  let open: OpenDatabase;
  beforeAll(async () => {
    open = await database();
  });
  afterAll(() => setDatabase(open));

  it('is ready when the database answers', async () => {
    const { status, body, headers } = await callRoute(healthRoute, { method: 'GET' });
    expect(status).toBe(200);
    expect(body).toEqual({ ready: true, database: open.kind });
    expect(headers.get('cache-control')).toBe('no-store');
  });

  it('is not ready when it does not, and says no more than that', async () => {
    const silent = { ...open.db, execute: () => Promise.reject(new Error('connection lost')) };
    setDatabase({ ...open, db: Object.assign(Object.create(open.db), silent) });
    const { status, body } = await callRoute(healthRoute, { method: 'GET' });
    expect(status).toBe(503);
    expect(body).toEqual({ ready: false });
  });
});
