import type { Opening, OpeningWishes } from '@/lib/contracts/openings';
import { type FoundOpening, missedWords, openingWhy } from '@/lib/schedule';
import { formatDayShort, formatWindowShort } from '@/lib/time/format-instant';
import { toLocal } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import type { Search } from './search-openings';

/** A found time as the wire has it, in the shop's zone and words. */
export function openingView(
  ctx: Context,
  found: FoundOpening,
  { crews, drives }: Pick<Search, 'crews' | 'drives'>,
  wishes: OpeningWishes,
): Opening {
  const { zone, region, rules } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const crewName = crews.get(found.crewId)?.name ?? '';
  const told = { crewName, zone, locale, wishes };
  const { date, time } = toLocal(found.startsAt, zone);
  const windowEndsAt = new Date(found.startsAt.getTime() + rules.booking.windowMinutes * 60_000);
  const window = { from: found.startsAt, until: windowEndsAt };
  const endsAt = found.pieces.at(-1)?.endsAt ?? found.startsAt;
  return {
    crewId: found.crewId,
    crewName,
    date,
    time,
    startsAt: found.startsAt.toISOString(),
    endsAt: endsAt.toISOString(),
    windowStartsAt: window.from.toISOString(),
    windowEndsAt: window.until.toISOString(),
    workMinutes: found.workMinutes,
    pieces: found.pieces.map((piece) => ({
      startsAt: piece.startsAt.toISOString(),
      endsAt: piece.endsAt.toISOString(),
    })),
    dayWords: formatDayShort(found.startsAt, zone, locale),
    windowWords: formatWindowShort(window, zone, locale),
    driveAddedMinutes: Math.round(found.driveAddedMinutes),
    isDriveEstimated: found.places.some((place) => place === null || drives.isEstimated(place)),
    leavesFreeMinutes: Math.round(found.leavesFreeMinutes),
    missedWishes: missedWords(found, told),
    score: Math.round(found.score * 100) / 100,
    why: openingWhy(found, told),
  };
}
