import type { ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import type { RecordReadingsAnswer, WallBookView } from '@/lib/contracts/rooms';
import type { Room } from '@/lib/contracts/wall-book';
import { apiPaths } from '@/lib/paths';
import { serve } from '../../server/start/serve.mjs';
import { getAt } from '../help/ask-at';
import { freePort } from '../help/free-port';
import { cookiesOf } from '../help/sign-in-at';

const count = 200;
/** Acknowledged so many, the server is killed: five times, each in the middle of a flow of readings. */
const killedAt = [23, 61, 104, 142, 187];
const atOnce = 3;

describe('a server killed in the middle of the readings', () => {
  const dataDirectory = mkdtempSync(path.join(os.tmpdir(), 'setwell-kill-'));
  const at = { baseUrl: '', cookie: '' };
  let port = 0;
  let server: ChildProcess;
  let readings: Reading[] = [];
  let roomId = '';

  beforeAll(async () => {
    port = await freePort();
    at.baseUrl = `http://localhost:${port}`;
    server = await start();
    at.cookie = await openShop(at.baseUrl);
    ({ roomId, readings } = await drawRoom(at));
  });
  afterAll(() => {
    server.kill('SIGKILL');
    rmSync(dataDirectory, { recursive: true, force: true });
  });

  async function start(): Promise<ChildProcess> {
    const child: ChildProcess = await serve({ port, dataDirectory, demo: false, quiet: true });
    child.stdout?.on('data', () => {});
    return child;
  }

  async function bookOnFile(): Promise<Map<string, Reading>> {
    const { wallBook } = await getAt<WallBookView>(at, apiPaths.room(roomId));
    return new Map(wallBook.readings.map((reading) => [reading.id, reading]));
  }

  /** Sends as a phone does, some at a time, until enough were acknowledged, and then kills; in flight stays in flight. */
  async function sendUntilKilled(acknowledged: Set<string>, most: number): Promise<void> {
    const waiting = readings.filter(({ id }) => !acknowledged.has(id));
    const killed = new Promise((resolve) => server.once('exit', resolve));
    const sendOn = async () => {
      for (let next = waiting.shift(); next; next = waiting.shift()) {
        const answer = await send([next]).catch(() => null);
        if (!answer) return;
        for (const id of answer.accepted) acknowledged.add(id);
        if (acknowledged.size >= most) server.kill('SIGKILL');
      }
    };
    await Promise.all(Array.from({ length: atOnce }, sendOn));
    await killed;
  }

  const send = (list: Reading[]) =>
    getAt<RecordReadingsAnswer>(at, apiPaths.readings(), { body: { roomId, readings: list } });

  it('has every acknowledged reading after five kills, and each of the 200 once in the end', async () => {
    const acknowledged = new Set<string>();
    for (const most of killedAt) {
      await sendUntilKilled(acknowledged, most);
      expect(acknowledged.size).toBeGreaterThanOrEqual(most);
      expect(acknowledged.size).toBeLessThan(count);
      await expect(fetch(at.baseUrl)).rejects.toThrow();
      server = await start();
      const book = await bookOnFile();
      const lost = [...acknowledged].filter((id) => !book.has(id));
      expect(lost, `after ${most} acknowledged`).toEqual([]);
    }
    // The phone does not know what became of those in flight: it sends all that it has no word of, and more.
    const { accepted, parked } = await send(readings);
    expect(parked).toEqual([]);
    expect(new Set(accepted).size).toBe(count);
    const book = await bookOnFile();
    expect([...book.keys()].sort()).toEqual(readings.map(({ id }) => id).sort());
    for (const reading of readings) expect(book.get(reading.id)).toEqual(reading);
  });
});

async function openShop(baseUrl: string): Promise<string> {
  const response = await fetch(baseUrl + apiPaths.shops(), {
    method: 'POST',
    headers: { origin: baseUrl, 'content-type': 'application/json' },
    body: JSON.stringify({
      shopName: 'Hard Knocks Joinery',
      region: 'US',
      zone: 'America/New_York',
      unit: 'in',
      personName: 'Nan Knock',
      email: 'nan@hardknocks.example',
      password: 'a-long-password',
    }),
  });
  expect(response.status).toBe(200);
  return cookiesOf(response);
}

async function drawRoom(at: { baseUrl: string; cookie: string }) {
  const { id: jobId } = await getAt<{ id: string }>(at, apiPaths.jobs(), {
    body: {
      customer: { name: 'Ned Bell' },
      site: { street: '3 Salt Row' },
      title: 'Kitchen, one wall',
      wallsReady: 'closed',
    },
  });
  const room: Room = {
    id: randomUUID(),
    name: 'Kitchen',
    chains: [
      {
        closed: true,
        walls: ['A', 'B', 'C', 'D'].map((name, index) => ({
          id: randomUUID(),
          name,
          nominalLengthMm: index % 2 === 0 ? 3600 : 2880,
          leftCornerDeg: 90,
        })),
      },
    ],
    wallThicknessToComeMm: 0,
    floorToComeMm: 0,
  };
  await getAt(at, apiPaths.rooms(), { body: { jobId, room } });
  const { tools } = await getAt<WallBookView>(at, apiPaths.room(room.id));
  const toolId = tools[0]?.id ?? '';
  return { roomId: room.id, readings: lengths(room, toolId) };
}

/** Lengths of the four walls at fifty heights, each of its own value. */
function lengths(room: Room, toolId: string): Reading[] {
  const walls = room.chains[0]?.walls ?? [];
  return Array.from({ length: count }, (_, index) => {
    const wall = walls[index % walls.length];
    if (!wall) throw new Error('the room has no walls');
    const sixteenths = 1700 + index;
    return {
      id: randomUUID(),
      roomId: room.id,
      toolId,
      kind: 'length',
      wallId: wall.id,
      zMm: 100 + Math.floor(index / walls.length) * 40,
      yMm: 0,
      valueMm: (sixteenths * 25.4) / 16,
      typed: `${sixteenths}/16`,
      unit: 'in',
      touches: 'board',
      takenAt: new Date(Date.UTC(2026, 11, 1, 14, 0, index)).toISOString(),
    };
  });
}
