import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import type { TestProject } from 'vitest/node';
import { type Role, roles } from '@/lib/permissions';
import { freePort } from '../help/free-port';
import { signInAt } from '../help/sign-in-at';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Where the built program answers, with the demo's shop in it. */
    baseUrl: string;
    chromium: string;
    /** The session of each role of the demo's shop, signed in once: tries at the door are counted. */
    sessions: Record<Role, string>;
  }
}

/** Starts the built program once, on a data folder of its own, for all browser tests. */
export default async function setup(project: TestProject) {
  const { ensureBuilt } = await import('../../server/start/ensure-built.mjs');
  const { findChromium } = await import('./find-chromium.mjs');
  const { serve } = await import('../../server/start/serve.mjs');
  const chromium = findChromium() ?? null;
  if (!chromium) throw new Error('The browser tests need Chromium.');
  ensureBuilt((words: string) => console.log(`· ${words}`));
  const dataDirectory = mkdtempSync(path.join(os.tmpdir(), 'setwell-browser-'));
  const port = await freePort();
  const baseUrl = `http://localhost:${port}`;
  const child: ChildProcess = await serve({ port, dataDirectory, demo: true, quiet: true });
  child.stdout?.on('data', () => {});
  const sessions = {} as Record<Role, string>;
  for (const role of roles) {
    sessions[role] = await signInAt(baseUrl, {
      email: `${role}@juniperbend.example`,
      password: 'setwell-demo',
    });
  }
  project.provide('baseUrl', baseUrl);
  project.provide('chromium', chromium);
  project.provide('sessions', sessions);
  return async () => {
    const ended = new Promise((resolve) => child.once('exit', resolve));
    child.kill('SIGTERM');
    await ended;
    rmSync(dataDirectory, { recursive: true, force: true });
  };
}
