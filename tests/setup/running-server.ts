import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import type { TestProject } from 'vitest/node';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Where the built program answers, with the demo's shop in it. */
    baseUrl: string;
    chromium: string;
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
  const child: ChildProcess = await serve({ port, dataDirectory, demo: true, quiet: true });
  child.stdout?.on('data', () => {});
  project.provide('baseUrl', `http://localhost:${port}`);
  project.provide('chromium', chromium);
  return async () => {
    const ended = new Promise((resolve) => child.once('exit', resolve));
    child.kill('SIGTERM');
    await ended;
    rmSync(dataDirectory, { recursive: true, force: true });
  };
}

export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(address && typeof address === 'object' ? address.port : 0));
    });
  });
}
