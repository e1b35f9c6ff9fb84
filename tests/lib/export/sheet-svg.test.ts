import { describe, expect, it } from 'vitest';
import { sheetSvg } from '@/lib/export/sheet-svg';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { crookedKitchen } from '../../help/crooked-kitchen';
import { releasedSheet } from '../../help/released-sheet';
import { readStrictXml, type XmlElement } from '../../help/strict-xml';

const sheet = releasedSheet();
const elements = readStrictXml(sheetSvg(sheet));
const texts = (all: XmlElement[]) => all.filter(({ name }) => name === 'text');

describe('sheetSvg', () => {
  it('is well formed and holds the plan and the elevation of each wall with runs', () => {
    const ids = elements.flatMap(({ attributes }) => (attributes.id ? [attributes.id] : []));
    expect(ids).toEqual(['plan', 'wall-A', 'wall-C']);
    expect(texts(elements).map(({ text }) => text)).toEqual(
      expect.arrayContaining([
        '2418 Kitchen, revision B',
        'Wall A: Sink wall, Uppers left, Uppers right · out-of-true drawn ×5',
      ]),
    );
  });

  it('is drawn in millimetres of the room: a wall is as long as it is', () => {
    const wall = sheet.fit.walls.find(({ name }) => name === 'A');
    const { viewBox = '', width = '' } = elements[0]?.attributes ?? {};
    const [, , viewWidth = 0] = viewBox.split(' ').map(Number);
    expect(Number.parseFloat(width)).toBeCloseTo(viewWidth / 24, 1);
    const spans = elements
      .filter(({ name }) => name === 'polyline')
      .map(({ attributes }) => (attributes.points ?? '').split(/[ ,]/).map(Number))
      .map(([x0 = 0, y0 = 0, x1 = 0, y1 = 0]) => Math.hypot(x1 - x0, y1 - y0));
    expect(spans.some((span) => Math.abs(span - (wall?.length?.value ?? 0)) < 0.1)).toBe(true);
  });

  it('names its fonts, links to nothing and runs nothing', () => {
    expect(elements[0]?.attributes['font-family']).toMatch(/^'Work Sans'/);
    const names = new Set(elements.map(({ name }) => name));
    expect([...names].sort()).toEqual(
      [
        'circle',
        'desc',
        'g',
        'polygon',
        'polyline',
        'rect',
        'svg',
        'text',
        'title',
        'tspan',
      ].filter((name) => names.has(name)),
    );
    for (const { attributes } of elements) {
      expect(Object.keys(attributes).filter((name) => /^on|href/.test(name))).toEqual([]);
    }
  });

  it('prints at 1:20 in metric shops', () => {
    const metric = readStrictXml(
      sheetSvg(releasedSheet({}, { rules: defaultShopRules('UK').fit })),
    );
    const { viewBox = '', width = '' } = metric[0]?.attributes ?? {};
    expect(Number.parseFloat(width)).toBeCloseTo(Number(viewBox.split(' ')[2]) / 20, 1);
  });

  it('says in red when the sheet is superseded, and only then', () => {
    const red = (all: XmlElement[]) =>
      texts(all).filter(
        ({ text, attributes }) => attributes.fill === '#B1402C' && text.startsWith('superseded'),
      );
    expect(red(elements)).toHaveLength(0);
    const older = readStrictXml(sheetSvg(releasedSheet({ newerRevision: 'C' })));
    expect(red(older).map(({ text }) => text)).toEqual(['superseded by revision C']);
  });

  it('stays well formed whatever people are called', () => {
    const kitchen = crookedKitchen();
    const runs = kitchen.runs.map((run) => ({ ...run, name: `</g><script>"&'\u0007\uD800` }));
    const all = readStrictXml(
      sheetSvg(releasedSheet({ customerName: '<b> & "x"' }, { kitchen: { ...kitchen, runs } })),
    );
    expect(all.some(({ name }) => name === 'script')).toBe(false);
    expect(texts(all).some(({ text }) => text.includes('<b> & "x"'))).toBe(true);
  });
});
