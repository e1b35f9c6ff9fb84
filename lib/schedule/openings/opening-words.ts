/** Why a time is offered, and what it misses, in the scheduler's words. */
import type { OpeningWishes } from '@/lib/contracts/openings';
import { weekdayOf } from '@/lib/time/civil';
import { formatLocalTime } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import { type TextLocale, weekdayWords } from '@/lib/time/text-locale';
import type { Zone } from '@/lib/time/zones';
import type { FoundOpening, MissedWish } from './opening-input';

type Told = { crewName: string; zone: Zone; locale: TextLocale; wishes: OpeningWishes };

/**
 * One sentence. Example: "Between Ostrander and Vance: 6 min more driving, 2 h 30 min still free." or
 * "An empty day for North crew: 38 min of driving, 5 h still free; not a Tuesday."
 */
export function openingWhy(opening: FoundOpening, told: Told): string {
  const facts = [
    driveWords(opening),
    opening.leavesFreeMinutes > 0
      ? `${durationWords(opening.leavesFreeMinutes)} still free`
      : 'fills the day',
  ];
  const misses = missedWords(opening, told);
  const but = misses.length > 0 ? `; ${misses.join(', ')}` : '';
  return `${whereWords(opening, told)}: ${facts.join(', ')}${but}.`;
}

/** Each wish that is missed, in a few words: "not a Tuesday", "before 9:30 AM". */
export function missedWords(opening: FoundOpening, told: Told): string[] {
  return opening.missedWishes.map((wish) => wishWords(wish, opening, told));
}

/** "45 min", "2 h", "2 h 30 min". */
export function durationWords(minutes: number): string {
  const whole = Math.round(minutes);
  const hours = Math.floor(whole / 60);
  const rest = whole % 60;
  return [hours > 0 ? `${hours} h` : '', rest > 0 || hours === 0 ? `${rest} min` : '']
    .filter((part) => part !== '')
    .join(' ');
}

function whereWords({ after, before, pieces }: FoundOpening, { crewName }: Told): string {
  if (after && before) return `Between ${after} and ${before}`;
  if (after && pieces.length === 1) return `After ${after}`;
  if (before) return `Before ${before}`;
  if (pieces.length > 1) {
    return `${pieces.length} days for ${crewName}${after ? `, after ${after}` : ''}`;
  }
  return `An empty day for ${crewName}`;
}

function driveWords({ driveAddedMinutes, after, before }: FoundOpening): string {
  const minutes = Math.round(driveAddedMinutes);
  if (!after && !before) return `${durationWords(minutes)} of driving`;
  return minutes > 0 ? `${durationWords(minutes)} more driving` : 'no more driving';
}

function wishWords(wish: MissedWish, opening: FoundOpening, told: Told): string {
  const { wishes, locale, zone } = told;
  const time = (text: string | undefined) => (text ? formatLocalTime(text, locale) : '');
  switch (wish) {
    case 'weekday': {
      const names = weekdayWords[locale.language];
      const isOne = wishes.weekdays.length === 1;
      const wished = names[(wishes.weekdays[0] ?? 1) - 1];
      const actual = names[weekdayOf(localDate(opening.startsAt, zone)) - 1];
      return isOne ? `not a ${wished}` : `a ${actual}`;
    }
    case 'not-before':
      return `before ${time(wishes.notBefore)}`;
    case 'not-after':
      return `after ${time(wishes.notAfter)}`;
    case 'done-by':
      return `not done by ${time(wishes.doneBy)}`;
    case 'away':
      return 'while nobody is in';
  }
}
