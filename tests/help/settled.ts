import type { BrowserContext, Page, Request } from 'playwright-core';
import { expect } from 'vitest';

/** What each page asked for and has no answer to yet. A stream of news has none ever. */
const awaited = new WeakMap<Page, Set<Request>>();

export function watchRequests(context: BrowserContext): void {
  context.on('page', (page) => {
    const open = new Set<Request>();
    awaited.set(page, open);
    page.on('request', (request) => {
      if (request.resourceType() === 'fetch') open.add(request);
    });
    page.on('requestfinished', (request) => open.delete(request));
    page.on('requestfailed', (request) => open.delete(request));
    // The requests of a page that was left are never heard of again.
    page.on('framenavigated', (frame) => {
      if (frame === page.mainFrame()) open.clear();
    });
  });
}

/** Waits until a page is at rest: its controls answer, and nothing is being fetched. */
export async function settled(page: Page): Promise<void> {
  let restedFor = 0;
  await expect
    .poll(
      async () => {
        const busy = [
          ...[...(awaited.get(page) ?? [])].map((request) => request.url()),
          ...(await page.evaluate(notYet)),
        ];
        // What begins to answer may ask for more: it must be seen at rest twice.
        restedFor = busy.length === 0 ? restedFor + 1 : 0;
        return restedFor >= 2 ? [] : ['at rest once only', ...busy];
      },
      { timeout: 15_000, interval: 60 },
    )
    .toEqual([]);
}

type Fiber = {
  child: Fiber | null;
  sibling: Fiber | null;
  memoizedState: { isDehydrated?: boolean; dehydrated?: unknown } | null;
  stateNode: { current: Fiber };
};

/**
 * Runs in the page. Controls that came as HTML do nothing until the library has taken them over, which no
 * attribute tells: it is read off the library's own tree, of the version that is installed.
 */
function notYet(): string[] {
  const key = Object.keys(document).find((name) => name.startsWith('__reactContainer'));
  if (!key) return ['the page is not taken over yet'];
  const held = (document as unknown as Record<string, Fiber>)[key];
  const waiting = [held?.stateNode.current ?? null];
  const found: string[] = [];
  for (let fiber = waiting.pop(); fiber; fiber = waiting.pop()) {
    const state = fiber.memoizedState;
    if (state?.isDehydrated || state?.dehydrated) found.push('a part is not taken over yet');
    for (const next of [fiber.sibling, fiber.child]) if (next) waiting.push(next);
  }
  const said = [...document.querySelectorAll('[role=status]')].map(
    ({ textContent }) => textContent ?? '',
  );
  return [...found, ...said.filter((words) => words.startsWith('Fetching'))];
}
