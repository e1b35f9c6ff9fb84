import { randomInt } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect, inject } from 'vitest';
import type { Role } from '@/lib/permissions';
import { watchRequests } from './settled';

export type Size = 'desk' | 'tablet' | 'phone';
export type Theme = 'light' | 'dark';

type Opening = {
  size?: Size;
  theme?: Theme;
  /** Who is signed in; nobody where it is left out. */
  as?: Role;
  /** Who is signed in, of another shop than the demo's: what their browser sends. */
  cookie?: string;
  javaScript?: boolean;
  /** Where the browser stands: "Asia/Tokyo"; where the machine stands, if left out. */
  timezone?: string;
  /** Lines of the console that belong to the test, such as a refusal that it asks for. */
  mayLog?: RegExp[];
};

export const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export const sizes = {
  desk: { viewport: { width: 1440, height: 900 } },
  tablet: { viewport: { width: 1024, height: 768 }, hasTouch: true },
  phone: {
    viewport: { width: 390, height: 844 },
    deviceScaleFactor: 2,
    isMobile: true,
    hasTouch: true,
  },
} as const;

/** One browser for the tests of a file. An error in the console of any of its pages fails the test that opened it. */
export function useBrowser() {
  let browser: Browser;
  const opened: BrowserContext[] = [];
  const faults: string[] = [];

  beforeAll(async () => {
    browser = await chromium.launch({ executablePath: inject('chromium'), args: flags });
  });
  afterAll(() => browser.close());
  afterEach(async () => {
    await Promise.all(opened.splice(0).map((context) => context.close()));
    expect(faults.splice(0)).toEqual([]);
  });

  async function openContext(opening: Opening = {}): Promise<BrowserContext> {
    const {
      size = 'desk',
      theme = 'light',
      as,
      javaScript = true,
      timezone,
      mayLog = [],
    } = opening;
    const cookie = opening.cookie ?? (as && inject('sessions')[as]);
    const baseURL = inject('baseUrl');
    const context = await browser.newContext({
      ...sizes[size],
      baseURL,
      colorScheme: theme,
      javaScriptEnabled: javaScript,
      timezoneId: timezone,
      // A second look at a page must not wait for things to slide.
      reducedMotion: 'reduce',
      locale: 'en-US',
      // Tries at the door are counted by address: each comes from one of its own, as phones do.
      extraHTTPHeaders: {
        'x-forwarded-for': `10.${randomInt(256)}.${randomInt(256)}.${randomInt(256)}`,
      },
    });
    context.setDefaultTimeout(30_000);
    opened.push(context);
    watchRequests(context);
    if (cookie) await context.addCookies(cookies(cookie, baseURL));
    const fault = (words: string) => {
      if (!mayLog.some((pattern) => pattern.test(words))) faults.push(words);
    };
    context.on('weberror', (error) => fault(`${error.page()?.url()}: ${error.error().stack}`));
    context.on('console', (message) => {
      if (message.type() === 'error') fault(`${message.page()?.url()}: ${message.text()}`);
    });
    return context;
  }

  return {
    openContext,
    openPage: async (opening: Opening = {}): Promise<Page> => {
      const context = await openContext(opening);
      return context.newPage();
    },
  };
}

function cookies(header: string, url: string) {
  return header.split('; ').map((pair) => {
    const at = pair.indexOf('=');
    return { name: pair.slice(0, at), value: pair.slice(at + 1), url };
  });
}

/** Signs in through the door as a person does: one tap in the demo. */
export async function signIn(page: Page, role: Role): Promise<void> {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: new RegExp(`^${role}`, 'i') }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

/** For whoever wants to look, with KEEP_PICTURES=1: tests/.out/shots/<name>-<size>-<theme>.png. */
export async function keepPicture(page: Page, name: string, theme: Theme = 'light') {
  if (!process.env.KEEP_PICTURES) return;
  const width = page.viewportSize()?.width;
  const size = Object.entries(sizes).find(([, { viewport }]) => viewport.width === width)?.[0];
  mkdirSync('tests/.out/shots', { recursive: true });
  await page.screenshot({
    path: `tests/.out/shots/${name}-${size}-${theme}.png`,
    fullPage: true,
    animations: 'disabled',
  });
}
