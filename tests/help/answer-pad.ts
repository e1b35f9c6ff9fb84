import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import { pressNext, typeInches } from './pad';

const titles: Partial<Record<Reading['kind'], RegExp>> = {
  corner: /^Corner/,
  length: /^Wall/,
  diagonal: /^Diagonal/,
  face: /gap to the/,
  floor: /^Floor/,
  ceiling: /^Ceiling/,
};

/** What is asked; nothing when nothing more is. */
export function questionOn(page: Page): Promise<string> {
  return page.evaluate(() => document.querySelector('h1')?.textContent ?? '');
}

/** Types what was read to the question that is asked, and goes on to the next. */
export async function answerPad(page: Page, reading: Reading, stepMm: number): Promise<void> {
  const asked = page.getByRole('heading', { level: 1, name: titles[reading.kind] });
  const setUp = page.getByRole('heading', { level: 1, name: /^Set up the/ });
  await asked.or(setUp).waitFor();
  if (await setUp.isVisible()) {
    await page
      .getByRole('button', { name: /^(Level held plumb|It stands|It has not moved)/ })
      .tap();
    await asked.waitFor();
  }
  const question = await questionOn(page);
  await typeInches(page, figureOf(reading), stepMm);
  await pressNext(page);
  await expect.poll(() => questionOn(page), { timeout: 5_000 }).not.toBe(question);
}

/** Whether its question is answered by digits at once, without anything to set up first. */
export const isTypedAtOnce = ({ kind }: Reading): boolean =>
  ['corner', 'length', 'diagonal'].includes(kind);

function figureOf(reading: Reading): number {
  switch (reading.kind) {
    case 'corner':
      return reading.by.method === 'legs' ? reading.by.diagonalMm : Number.NaN;
    case 'face':
      return reading.gapMm;
    case 'floor':
      return reading.dropMm;
    case 'ceiling':
      return reading.riseMm;
    default:
      return 'valueMm' in reading ? reading.valueMm : Number.NaN;
  }
}
