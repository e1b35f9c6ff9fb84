import { describe, expect, it } from 'vitest';
import { lengthWords } from '@/components/ui/length-words';

const say = (whole: number, numerator: number, denominator: number, isNegative = false) =>
  lengthWords({ isNegative, whole, numerator, denominator });

describe('lengthWords', () => {
  it.each([
    [say(34, 1, 2), '34 and a half inches'],
    [say(95, 1, 16), '95 and a sixteenth inches'],
    [say(25, 3, 4), '25 and 3 quarters inches'],
    [say(0, 1, 8), 'an eighth of an inch'],
    [say(0, 13, 16), '13 sixteenths of an inch'],
    [say(1, 0, 1), '1 inch'],
    [say(0, 0, 1), '0 inches'],
    [say(2, 5, 32, true), 'minus 2 and 5 thirty-seconds inches'],
    [say(2, 1, 3), '2 and 1 over 3 inches'],
  ])('says %s', (said, expected) => {
    expect(said).toBe(expected);
  });
});
