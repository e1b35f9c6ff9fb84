import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { type BrowserContext, chromium, type Page } from 'playwright-core';
import { afterEach, inject } from 'vitest';
import { flags, sizes } from './browser';

export type OwnPhone = {
  /** The page that is open; another after each start. */
  page: Page;
  /** How often the glass was touched, over all its lives. */
  taps: number;
  setOffline: (isOffline: boolean) => Promise<void>;
  /** Ends the browser's process where it stands, as a phone does when it needs room or its battery is empty. */
  kill: () => Promise<void>;
  /** Starts it again on the same storage. */
  start: () => Promise<void>;
};

type Options = { baseUrl: string; cookie: string; zone: string };

/** Phones that keep their storage on disk, and so can be killed; gone after each test. */
export function useOwnPhones() {
  const folders: string[] = [];
  const opened: BrowserContext[] = [];
  afterEach(async () => {
    await Promise.all(opened.splice(0).map((context) => context.close().catch(() => {})));
    for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true });
  });

  return async function ownPhone({ baseUrl, cookie, zone }: Options): Promise<OwnPhone> {
    const folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-phone-'));
    folders.push(folder);
    let context: BrowserContext | null = null;
    let isOffline = false;
    const held = (): BrowserContext => {
      if (!context) throw new Error('the phone is off');
      return context;
    };
    const phone: OwnPhone = {
      taps: 0,
      get page() {
        const page = held().pages().at(-1);
        if (!page) throw new Error('no page is open');
        return page;
      },
      async start() {
        context = await chromium.launchPersistentContext(folder, {
          ...sizes.phone,
          executablePath: inject('chromium'),
          args: flags,
          baseURL: baseUrl,
          locale: 'en-US',
          timezoneId: zone,
          reducedMotion: 'reduce',
        });
        opened.push(context);
        context.setDefaultTimeout(30_000);
        await context.exposeFunction('countTap', () => {
          phone.taps += 1;
        });
        await context.addInitScript(() =>
          addEventListener('pointerdown', () => Reflect.get(window, 'countTap')(), true),
        );
        await context.setOffline(isOffline);
        // A killed browser may not have written its cookies yet; the person is signed in all the same.
        await context.addCookies(cookiesFor(cookie, baseUrl));
      },
      async setOffline(next) {
        isOffline = next;
        await held().setOffline(next);
      },
      async kill() {
        const gone = new Promise((resolve) => held().once('close', resolve));
        for (const pid of processesOn(folder)) process.kill(pid, 'SIGKILL');
        await gone;
        context = null;
      },
    };
    await phone.start();
    return phone;
  };
}

/** The processes that were started on this folder, by what they were started with. */
function processesOn(folder: string): number[] {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .filter((name) => {
      try {
        return readFileSync(`/proc/${name}/cmdline`, 'utf8').includes(`--user-data-dir=${folder}`);
      } catch {
        return false;
      }
    })
    .map(Number);
}

function cookiesFor(header: string, url: string) {
  return header.split('; ').map((pair) => {
    const at = pair.indexOf('=');
    return { name: pair.slice(0, at), value: pair.slice(at + 1), url };
  });
}
