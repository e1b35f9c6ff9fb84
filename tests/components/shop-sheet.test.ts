import { AppRouterContext } from 'next/dist/shared/lib/app-router-context.shared-runtime';
import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { ShopSheet } from '@/components/sheet/shop-sheet';
import { releasedSheet } from '../help/released-sheet';

const router = {
  push: () => {},
  replace: () => {},
  refresh: () => {},
  back: () => {},
  forward: () => {},
  prefetch: () => {},
  bfcacheId: '0',
};

function rendered(change: Parameters<typeof releasedSheet>[0] = {}, mayTakeUp = false): string {
  const sheet = createElement(ShopSheet, { sheet: releasedSheet(change), mayTakeUp });
  return renderToStaticMarkup(createElement(AppRouterContext, { value: router }, sheet));
}
const count = (text: string, part: string) => text.split(part).length - 1;

describe('ShopSheet', () => {
  it('has a leaf for the room and for each wall with a run, each with its revision and number', () => {
    const page = rendered();
    expect(count(page, 'class="sheet-leaf')).toBe(3);
    for (const leaf of ['leaf 1 of 3', 'leaf 2 of 3', 'leaf 3 of 3']) expect(page).toContain(leaf);
    expect(page).not.toContain('Superseded');
  });

  it('says on every leaf in red that it is superseded, by what, and not to cut from it', () => {
    const page = rendered({ newerRevision: 'C', supersededBy: ['Sink wall: the run is gone'] });
    expect(count(page, 'Superseded. Do not cut from revision B.')).toBe(3);
    expect(count(page, 'bg-chalk')).toBeGreaterThanOrEqual(3);
    expect(count(page, 'Sink wall: the run is gone')).toBe(3);
  });

  it('says so as well when only the room has changed since', () => {
    const page = rendered({ supersededBy: ['Taken back: Wall A, stud'] });
    expect(count(page, 'no newer revision is out yet')).toBe(3);
  });

  it('shows how sure it is beside every cut size', () => {
    const page = rendered();
    const rows = page
      .split('<caption class="sr-only">Cut list</caption>')
      .slice(1)
      .join('')
      .split('<tr class="border-b border-rule')
      .slice(1);
    expect(rows.length).toBeGreaterThanOrEqual(9);
    for (const row of rows) expect(row).toMatch(/give or take |as set/);
  });

  it('offers to be taken up only to the bench, only the newest, only once', () => {
    const offer = 'Take it up at the bench';
    expect(rendered({}, true)).toContain(offer);
    expect(rendered({}, false)).not.toContain(offer);
    expect(rendered({ newerRevision: 'C' }, true)).not.toContain(offer);
    const { release } = releasedSheet();
    expect(rendered({ release: { ...release, takenUpWords: 'Bo, Tue' } }, true)).not.toContain(
      offer,
    );
  });

  it('gives the reason for which it went out with points open', () => {
    expect(rendered({ overrideReason: 'boxes are built' })).toContain('boxes are built');
  });
});
