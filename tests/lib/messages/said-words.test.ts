import { describe, expect, test } from 'vitest';
import { missingThings } from '@/lib/messages/missing-words';
import { callMeWords, notReadyWords, otherTimeWords, saidBack } from '@/lib/messages/said-words';

describe('what a customer asks', () => {
  test('is said back in Spanish where it is ours, and as it is where it is theirs', () => {
    const all = notReadyWords(missingThings, 'llega el viernes');
    expect(all).toBe(
      'the floor; the power; room to park; nobody at home that day; llega el viernes',
    );
    expect(saidBack(all, 'es')).toBe(
      'el piso; la electricidad; lugar para estacionar; ese día no hay nadie en casa; llega el viernes',
    );
    expect(saidBack(callMeWords('después de las seis'), 'es')).toBe(
      'Llámenme: después de las seis',
    );
    expect(saidBack(otherTimeWords('mejor el lunes'), 'es')).toBe('mejor el lunes');
  });

  test('has Spanish words for whoever said nothing more', () => {
    for (const says of [callMeWords(''), otherTimeWords(''), notReadyWords([], '')]) {
      expect(saidBack(says, 'es')).not.toBe(says);
      expect(saidBack(says, 'en')).toBe(says);
    }
  });
});
