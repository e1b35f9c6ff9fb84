import type { Page } from 'playwright-core';
import { fractionParts } from '@/lib/units/fraction-parts';
import { spokenInches } from '@/lib/units/spoken-inches';

/** Types an inch length on the pad as a thumb does: digits, then a tick of the tape. */
export async function typeInches(page: Page, valueMm: number, stepMm: number): Promise<void> {
  const { whole, numerator, denominator } = fractionParts(valueMm, stepMm);
  for (const digit of String(whole)) {
    await page.getByRole('button', { name: digit, exact: true }).tap();
  }
  if (numerator === 0) return;
  const tick = spokenInches({ negative: false, whole: 0, numerator, denominator });
  await page.getByRole('button', { name: tick, exact: true }).tap();
}

export async function pressNext(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^next/ }).tap();
}
