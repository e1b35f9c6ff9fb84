import type { Locator, Page } from 'playwright-core';

/**
 * Seconds of the keystroke-level model (S. K. Card, T. P. Moran and A. Newell, 1980; from memory): a key of an average
 * typist, a pointing with its click, a hand that changes between mouse and keys, a thought before a step.
 */
const seconds = { key: 0.28, point: 1.3, hand: 0.4, think: 1.35 };
/** Silent reading of English, words a minute (M. Brysbaert, 2019; from memory). */
const wordsReadPerMinute = 238;

type Count = { screens: number; clicks: number; keys: number; fields: number; wordsRead: number };

/** A hand that does what a newcomer does, and counts it. */
export function countedHand(page: Page) {
  const count: Count = { screens: 0, clicks: 0, keys: 0, fields: 0, wordsRead: 0 };
  return {
    count,
    /** A screen that is new to them is read from first word to last, but for the pages' names at its side. */
    async see(heading: Locator) {
      await heading.waitFor();
      count.screens += 1;
      const [text = ''] = await page.locator('main').allInnerTexts();
      count.wordsRead += text.split(/\s+/).filter((word) => /[a-z]/i.test(word)).length;
    },
    async click(target: Locator) {
      await target.click();
      count.clicks += 1;
    },
    async type(field: Locator, text: string) {
      await field.fill(text);
      count.fields += 1;
      count.keys += text.length;
    },
  };
}

/** Minutes that a person needs at least: every key, click and thought, and every word of every screen read once. */
export function minutesOf({ clicks, keys, fields, wordsRead }: Count): number {
  const { key, point, hand, think } = seconds;
  const doing = keys * key + clicks * (point + think) + fields * (point + 2 * hand + think);
  return doing / 60 + wordsRead / wordsReadPerMinute;
}
