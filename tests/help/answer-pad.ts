import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import type { Reading } from '@/lib/contracts/wall-book';
import { pressNext, typeInches } from './pad';

const titles: Partial<Record<Reading['kind'], RegExp>> = {
  corner: /^Corner/,
  length: /^Wall/,
  diagonal: /^Diagonal/,
};

/** What is asked; nothing when nothing more is. */
export function questionOn(page: Page): Promise<string> {
  return page.evaluate(() => document.querySelector('h1')?.textContent ?? '');
}

/** Types what was read to the question that is asked, and goes on to the next. */
export async function answerPad(page: Page, reading: Reading, stepMm: number): Promise<void> {
  const valueMm =
    reading.kind === 'corner' && reading.by.method === 'legs'
      ? reading.by.diagonalMm
      : 'valueMm' in reading
        ? reading.valueMm
        : Number.NaN;
  await page.getByRole('heading', { level: 1, name: titles[reading.kind] }).waitFor();
  const question = await questionOn(page);
  await typeInches(page, valueMm, stepMm);
  await pressNext(page);
  await expect.poll(() => questionOn(page), { timeout: 5_000 }).not.toBe(question);
}
