import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { database } from '@/server/base/database';
import { startUp } from '@/server/start/start-up';

describe('next build', () => {
  afterEach(() => {
    vi.unstubAllEnvs();
    Reflect.deleteProperty(globalThis, '__setwellDatabase');
  });

  it('is refused the database, and makes no data folder', async () => {
    const folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-build-'));
    const data = path.join(folder, 'data');
    vi.stubEnv('NEXT_PHASE', 'phase-production-build');
    vi.stubEnv('SETWELL_DATA', data);
    await startUp();
    await expect(database()).rejects.toThrow('The build must not open the database.');
    expect(existsSync(data)).toBe(false);
    rmSync(folder, { recursive: true });
  });

  it('is started by the launchers where a database that was opened would fail it', () => {
    const launcher = readFileSync('server/start/ensure-built.mjs', 'utf8');
    expect(launcher).toMatch(/DATABASE_URL: 'postgres:\/\/nowhere\.invalid/);
    expect(launcher).toMatch(/SETWELL_DATA: '\/dev\/null\//);
  });
});
