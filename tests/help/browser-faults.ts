import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

type Fault = { page: string; fault: string; where: string; why?: string };

/** No fault that axe calls serious or critical, and nothing that makes the page scroll sideways. */
export async function expectNoSeriousFault(page: Page): Promise<void> {
  expect(await seriousFaults(page)).toEqual([]);
}

export async function seriousFaults(page: Page): Promise<Fault[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const serious = violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .flatMap(({ id, help, nodes }) =>
      nodes.map(({ target, failureSummary }) => ({
        page: page.url(),
        fault: `${id}: ${help}`,
        where: target.join(' '),
        why: failureSummary?.split('\n').slice(1).join(' ').trim(),
      })),
    );
  return [...serious, ...(await stickingOut(page))];
}

/** What makes the page scroll sideways: the outermost things that stick out, named so that they can be found. */
async function stickingOut(page: Page): Promise<Fault[]> {
  const wide = await page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement;
    if (scrollWidth <= clientWidth) return [];
    return [...document.querySelectorAll('body *')]
      .filter((element) => element.getBoundingClientRect().right > clientWidth + 1)
      .slice(0, 5)
      .map((element) => `${element.tagName} ${element.className}`.slice(0, 120));
  });
  return wide.map((where) => ({ page: page.url(), fault: 'the page scrolls sideways', where }));
}
