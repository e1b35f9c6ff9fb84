import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sortedJson } from '@/lib/sync/sorted-json';

describe('sortedJson', () => {
  it('writes keys in order at every depth and keeps the order of lists', () => {
    expect(sortedJson({ b: [{ d: 1, c: 2 }, 3], a: null })).toBe(
      '{"a":null,"b":[{"c":2,"d":1},3]}',
    );
  });

  it('leaves out what is undefined', () => {
    expect(sortedJson({ a: undefined, b: 1 })).toBe(sortedJson({ b: 1 }));
  });

  it('gives one text for one value, whichever way its keys came', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
        const turned = Object.fromEntries(Object.entries(value).reverse());
        expect(sortedJson(turned)).toBe(sortedJson(value));
        expect(JSON.parse(sortedJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });
});
