import type { Page } from 'playwright-core';
import { pressNext, typeInches } from './pad';
import { sixWallsInches } from './true-kitchen';

/** Draws the L of six walls by touch: all round, an outside corner after wall C, an inside one after D. */
export async function drawSixWalls(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^All round/ }).tap();
  for (const [at, inches] of sixWallsInches.entries()) {
    const name = 'ABCDEF'[at] ?? '';
    await page.getByRole('heading', { level: 1, name: `Wall ${name}, roughly` }).waitFor();
    await typeInches(page, inches * 25.4, 25.4 / 16);
    const turn = name === 'C' ? 'outside' : name === 'D' ? 'inside' : null;
    if (turn === null) {
      await pressNext(page);
      continue;
    }
    await page.getByRole('button', { name: 'add or take away' }).tap();
    await page.getByRole('button', { name: new RegExp(`round an ${turn} corner`) }).tap();
  }
  await page.getByRole('button', { name: 'Kitchen', exact: true }).tap();
  await page.getByRole('button', { name: 'Start measuring' }).tap();
}
