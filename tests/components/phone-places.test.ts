import { describe, expect, it } from 'vitest';
import { directionsHref } from '@/components/phone/directions';
import { tapsFrom } from '@/components/phone/visit-report';
import { type BookPlace, placeHref, placeOf } from '@/components/walls/book-place';
import { id } from '@/tests/help/wall-book-examples';

describe('places of the wall book', () => {
  it.each<BookPlace>([
    { at: 'next' },
    { at: 'list' },
    { at: 'leave' },
    { at: 'sketch' },
    { at: 'sketch', wallId: id(1) },
    { at: 'wall', wallId: id(1) },
    { at: 'reading', readingId: id(2) },
    { at: 'correct', readingId: id(2) },
    { at: 'again', readingId: id(2) },
    { at: 'feature', wallId: id(1) },
    { at: 'feature', wallId: id(1), readingId: id(2) },
    { at: 'add', kind: 'doorway', wallId: '' },
    { at: 'ask', slot: `length:${id(1)}:910` },
    { at: 'ask', slot: 'a slot/with 100 % of "signs"' },
  ])('finds the way back to %j', (place) => {
    expect(placeOf(placeHref(place))).toEqual(place);
  });

  it.each(['', '#', '#nowhere', '#wall', '#reading/', '#ask', '#%E0%A4%A'])(
    'takes "%s" for the next question',
    (hash) => {
      expect(placeOf(hash)).toEqual({ at: 'next' });
    },
  );
});

describe('taps of a visit', () => {
  it.each([
    ['booked', ['on-the-way', 'arrived', 'running-late']],
    ['on-the-way', ['arrived', 'running-late', 'nobody-home']],
    ['on-site', ['done', 'nobody-home']],
    ['done', []],
    ['called-off', []],
  ] as const)('offers from %s: %j', (status, taps) => {
    expect(tapsFrom(status)).toEqual(taps);
  });
});

describe('directionsHref', () => {
  it.each([
    ['Mozilla/5.0 (Linux; Android 15)', 'geo:0,0?q=4%20Orchard%20End%2C%20Upper%20Fold'],
    ['Mozilla/5.0 (iPhone; CPU iPhone OS 18_0)', 'maps:?daddr=4%20Orchard%20End%2C%20Upper%20Fold'],
  ])('for %s is %s', (agent, href) => {
    expect(directionsHref('4 Orchard End', 'Upper Fold', agent)).toBe(href);
  });
});
