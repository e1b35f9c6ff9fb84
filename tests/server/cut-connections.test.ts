import { sql } from 'drizzle-orm';
import { describe, expect, inject, it } from 'vitest';
import { database } from '@/server/base/database';

describe.skipIf(!inject('serverUrl'))('a database server that is started again', () => {
  it('cuts the connections that wait, and the next question is answered all the same', async () => {
    const { db } = await database();
    await Promise.all([1, 2, 3].map(() => db.execute(sql`SELECT pg_sleep(0.05)`)));
    await db.execute(
      sql`SELECT pg_terminate_backend(pid) FROM pg_stat_activity
          WHERE datname = current_database() AND pid <> pg_backend_pid()`,
    );
    // The cut is heard between two turns of the loop, while nobody asks anything.
    await new Promise((heard) => setTimeout(heard, 100));
    const { rows } = (await db.execute(sql`SELECT 1 AS one`)) as unknown as { rows: unknown[] };
    expect(rows).toEqual([{ one: 1 }]);
  });

  it('is listened to again, and whoever listens hears that something may have been missed', async () => {
    const open = await database();
    const heard: string[] = [];
    const stop = await open.listen('cut_test', (payload) => heard.push(payload));
    await open.db.execute(
      sql`SELECT pg_terminate_backend(pid) FROM pg_stat_activity
          WHERE datname = current_database() AND pid <> pg_backend_pid()`,
    );
    await expect.poll(() => heard, { timeout: 5_000 }).toEqual(['']);
    await open.db.execute(sql`SELECT pg_notify('cut_test', 'after')`);
    await expect.poll(() => heard).toEqual(['', 'after']);
    await stop();
  });
});
