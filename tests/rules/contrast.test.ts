import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

/** Contrast of every pair used for text, from the values in globals.css (WCAG 2.2, 1.4.3 and 1.4.6). */
const css = readFileSync(path.resolve(__dirname, '../../app/globals.css'), 'utf8');

const letters = ['ink', 'graphite', 'pine', 'chalk', 'ochre', 'moss', 'blueprint'];
const grounds = ['paper', 'sheet', 'tint'];
const fills = ['pine', 'chalk', 'blueprint'];
const crews = ['crew1', 'crew2', 'crew3', 'crew4', 'crew5', 'crew6'];

const root = blockOf(':root {');
const sun = blockOf('.in-sun {');
const light = colours(withoutDark(root));
const dark = { ...light, ...colours(darkOf(root)) };

const sets = [
  { name: 'light', set: light, least: 4.5 },
  { name: 'dark', set: dark, least: 4.5 },
  { name: 'light in sun', set: { ...light, ...colours(withoutDark(sun)) }, least: 7 },
  { name: 'dark in sun', set: { ...dark, ...colours(darkOf(sun)) }, least: 7 },
];

describe.each(sets)('colours, $name', ({ set, least }) => {
  const pairs = letters.flatMap((letter) => grounds.map((ground) => [letter, ground] as const));
  it.each(pairs)(`%s on %s reads at ${least} to 1`, (letter, ground) => {
    expect(contrast(set[letter], set[ground])).toBeGreaterThanOrEqual(least);
  });

  it.each(fills)(`letters on a filled %s read at 4.5 to 1`, (fill) => {
    expect(contrast(set['on-fill'], set[fill])).toBeGreaterThanOrEqual(4.5);
  });

  it.each(crews)('%s stands out from paper and sheet at 4.5 to 1', (crew) => {
    expect(contrast(set[crew], set.paper)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(set[crew], set.sheet)).toBeGreaterThanOrEqual(4.5);
  });

  it('draws the edge of a field at 3 to 1 (1.4.11)', () => {
    expect(contrast(set.graphite, set.sheet)).toBeGreaterThanOrEqual(3);
  });
});

function blockOf(opening: string): string {
  const start = css.indexOf(opening);
  expect(start).toBeGreaterThan(-1);
  let depth = 0;
  for (let at = css.indexOf('{', start); at < css.length; at += 1) {
    if (css[at] === '{') depth += 1;
    if (css[at] === '}') depth -= 1;
    if (depth === 0) return css.slice(start, at);
  }
  throw new Error(`globals.css: "${opening}" is not closed`);
}

function darkOf(block: string): string {
  return block.slice(block.indexOf('@variant dark'));
}

function withoutDark(block: string): string {
  return block.slice(0, block.indexOf('@variant dark'));
}

function colours(block: string): Record<string, string> {
  const found = [...block.matchAll(/--([a-z0-9-]+): (#[0-9a-f]{6});/g)];
  return Object.fromEntries(found.map(([, name, value]) => [name, value]));
}

function contrast(one: string | undefined, other: string | undefined): number {
  const [high, low] = [luminance(one), luminance(other)];
  return (Math.max(high, low) + 0.05) / (Math.min(high, low) + 0.05);
}

function luminance(hex: string | undefined): number {
  if (!hex) throw new Error('a colour is missing from globals.css');
  const linear = (at: number) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * linear(1) + 0.7152 * linear(3) + 0.0722 * linear(5);
}
