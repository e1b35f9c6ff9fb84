import { describe, expect, it } from 'vitest';
import { type KeyBinding, keySigns, stepKeys } from '@/components/shell/key-bindings';

const binding = (keys: string): KeyBinding => ({ keys, words: keys, run: () => undefined });
const goDiary = binding('g d');
const newVisit = binding('n');
const day = binding('d');
const bindings = [goDiary, newVisit, day, binding('ArrowLeft')];

/** Presses the keys one after another and gives what the last one found. */
function press(keys: string, from: readonly KeyBinding[] = bindings) {
  let pressed = '';
  let found: KeyBinding | null = null;
  for (const key of keys.split(' ')) {
    const step = stepKeys(from, pressed, key);
    pressed = step.pressed;
    found = step.binding;
  }
  return found?.keys ?? null;
}

describe('stepKeys', () => {
  it.each([
    ['n', 'n'],
    ['N', 'n'],
    ['g d', 'g d'],
    ['g', null],
    ['d', 'd'],
    ['x d', 'd'],
    ['g n', 'n'],
    ['g g d', 'g d'],
    ['g d d', 'd'],
    ['ArrowLeft', 'ArrowLeft'],
    ['q', null],
  ])('finds after %s: %s', (keys, found) => {
    expect(press(keys)).toBe(found);
  });

  it('lets a page take a key from the shell', () => {
    const ofPage = { ...newVisit, words: 'of the page' };
    expect(stepKeys([newVisit, ofPage], '', 'n').binding).toBe(ofPage);
  });
});

describe('keySigns', () => {
  it('writes keys as they are printed', () => {
    expect(keySigns('g d')).toBe('G D');
    expect(keySigns('ArrowLeft')).toBe('←');
  });
});
