import { sql } from 'drizzle-orm';
import { database } from './database';
import { logBug } from './log';

/** Ready when the database answers: the framework says "ready" before start-up has ended. */
export async function checkHealth(): Promise<Response> {
  try {
    const { db, kind } = await database();
    await db.execute(sql`select 1`);
    return Response.json(
      { ready: true, database: kind },
      { headers: { 'cache-control': 'no-store' } },
    );
  } catch (error) {
    logBug('health', error);
    return Response.json({ ready: false }, { status: 503 });
  }
}
