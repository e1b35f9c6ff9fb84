import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { getTableName, sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import type { OpenDatabase } from '@/db/database';
import { openEmbedded } from '@/db/open-embedded';
import { jobs, people, readings, walls } from '@/db/schema';
import { writeBackUp } from '@/server/base/back-ups/write-back-up';
import { database, setDatabase } from '@/server/base/database';
import { recordReadings } from '@/server/walls/record-readings';
import { contextOf, makeShop } from '../help/make-shop';
import { lengthOn, putDrawnKitchen } from '../help/put-kitchen';

describe.skipIf(inject('serverUrl'))('a copy of the embedded database', () => {
  const root = mkdtempSync(path.join(os.tmpdir(), 'setwell-back-up-'));
  const places = {
    dataDirectory: path.join(root, 'data'),
    backUpDirectory: path.join(root, 'back-ups'),
  };
  let before: OpenDatabase;
  let open: OpenDatabase;
  beforeAll(async () => {
    before = await database();
    open = await openEmbedded(places.dataDirectory);
    setDatabase(open);
  });
  afterAll(async () => {
    setDatabase(before);
    await open.close();
    rmSync(root, { recursive: true, force: true });
  });

  const restore = (copy: string, to: string) =>
    spawnSync(process.execPath, ['server/start/restore.mjs', copy, '--to', to], {
      encoding: 'utf8',
    });

  it('taken while readings arrive and put back elsewhere has every row that was acknowledged', async () => {
    const shop = await makeShop();
    const kitchen = await putDrawnKitchen(shop);
    const ctx = await contextOf(shop, 'measurer', new Date());
    mkdirSync(path.join(places.dataDirectory, 'files'));
    writeFileSync(path.join(places.dataDirectory, 'files', 'wall.jpg'), 'photo');
    const acknowledged: string[] = [];
    let isWriting = true;
    const writing = (async () => {
      while (isWriting) {
        const reading = lengthOn(kitchen, 0);
        await recordReadings(ctx, { roomId: kitchen.roomId, readings: [reading] });
        acknowledged.push(reading.id);
        // The embedded database answers within one turn of the loop: timers would never get theirs.
        await new Promise(setImmediate);
      }
    })();
    while (acknowledged.length < 20) await new Promise((later) => setTimeout(later, 5));
    const acknowledgedBefore = [...acknowledged];
    const counted = await countRows(open, [jobs, people, walls]);
    const copy = await writeBackUp(open, places, new Date());
    isWriting = false;
    await writing;

    const to = path.join(root, 'restored');
    const said = restore(copy, to);
    expect(said.stderr).toBe('');
    expect(said.stdout).toContain('1 jobs, 0 visits');
    const restored = await openEmbedded(to);
    try {
      expect(await countRows(restored, [jobs, people, walls])).toEqual(counted);
      const rows = await restored.db.select({ id: readings.id }).from(readings);
      const ids = new Set(rows.map(({ id }) => id));
      expect(acknowledgedBefore.filter((id) => !ids.has(id))).toEqual([]);
      expect(ids.size).toBeLessThanOrEqual(acknowledged.length);
    } finally {
      await restored.close();
    }
    expect(readFileSync(path.join(to, 'files', 'wall.jpg'), 'utf8')).toBe('photo');
  });

  it('is not put over a database that is there', async () => {
    const [copy] = copiesIn(places.backUpDirectory);
    const said = restore(path.join(places.backUpDirectory, copy as string), places.dataDirectory);
    expect(said.status).toBe(1);
    expect(said.stderr).toContain('Stop it first; nothing was changed');
  });

  it('goes when it is no longer wanted, and an erased photo goes with the next', async () => {
    const old = 'setwell-2020-01-01T00-00-00Z.tar.gz';
    writeFileSync(path.join(places.backUpDirectory, old), 'old');
    rmSync(path.join(places.dataDirectory, 'files', 'wall.jpg'));
    await writeBackUp(open, places, new Date(Date.now() + 1_000));
    expect(copiesIn(places.backUpDirectory)).not.toContain(old);
    expect(copiesIn(places.backUpDirectory)).toHaveLength(2);
    expect(readdirSync(path.join(places.backUpDirectory, 'files'))).toEqual([]);
  });
});

const copiesIn = (folder: string) =>
  readdirSync(folder).filter((name) => name.startsWith('setwell-'));

async function countRows({ db }: OpenDatabase, tables: Parameters<typeof getTableName>[0][]) {
  const counted: Record<string, number> = {};
  for (const table of tables) {
    const [row] = await db.select({ n: sql<number>`count(*)::int` }).from(table as typeof jobs);
    counted[getTableName(table)] = row?.n ?? -1;
  }
  return counted;
}
