import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/database';
import { visitPiecePeople, visitPieces, visits } from '@/db/schema';
import { splitIntoPieces } from '@/lib/schedule';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatDayShort } from '@/lib/time/format-instant';
import type { DemoVisit } from './demo-jobs';
import type { SeedShop } from './seed-demo';
import type { StoryLine } from './seed-story';
import { crewsOfTheShop } from './staff';
import { workday } from './workday';

/** A visit with its daily pieces; done when it is past, under way when it is now. */
export async function seedVisit(
  tx: Transaction,
  shop: SeedShop,
  { jobId, customer, visit }: { jobId: string; customer: string; visit: DemoVisit },
): Promise<StoryLine[]> {
  const startsAt = workday(shop, visit.day, visit.time);
  const { zone, rules, now, id: shopId } = shop;
  const { value: pieces } = splitIntoPieces({
    workMinutes: visit.workMinutes,
    startsAt,
    pattern: rules.booking,
    zone,
  });
  const last = pieces?.at(-1);
  if (!pieces || !last) throw new Error(`the demo's visit does not fit: ${JSON.stringify(visit)}`);
  const crew = shop.crews[visit.crew];
  const isDone = last.endsAt <= now && visit.day < 0;
  const hasBegun = visit.day < 0;
  const went = howItWent(customer, visit);
  const visitId = randomUUID();
  await tx.insert(visits).values({
    id: visitId,
    shopId,
    jobId,
    kind: visit.kind,
    crewId: crew.id,
    status: visit.isMissed
      ? 'missed'
      : isDone
        ? 'done'
        : hasBegun
          ? 'on-site'
          : visit.isConfirmed
            ? 'confirmed'
            : 'booked',
    startsAt,
    endsAt: last.endsAt,
    windowStartsAt: startsAt,
    windowEndsAt: new Date(startsAt.getTime() + rules.booking.windowMinutes * 60_000),
    workMinutes: visit.workMinutes,
    customerSays: visit.customerSays ?? '',
    confirmedAt: visit.isConfirmed
      ? new Date(startsAt.getTime() - went.confirmedHoursBefore * 3_600_000)
      : null,
    arrivedAt: hasBegun && !visit.isMissed ? later(startsAt, went.lateMin) : null,
    leftAt: isDone && !visit.isMissed ? later(last.endsAt, went.longerMin) : null,
  });
  await shop.linkVisit(tx, { shopId, visitId, endsAt: last.endsAt });
  for (const piece of pieces) {
    const pieceId = randomUUID();
    await tx
      .insert(visitPieces)
      .values({ id: pieceId, shopId, visitId, crewId: crew.id, ...piece });
    await tx
      .insert(visitPiecePeople)
      .values(crew.personIds.map((personId) => ({ shopId, pieceId, personId, ...piece })));
  }
  return storyOf(shop, { visitId, customer, visit, startsAt, endsAt: last.endsAt });
}

const later = (at: Date, minutes: number) => new Date(at.getTime() + minutes * 60_000);

/** As days go: most crews a little after the start of the window, a few past its end; some work takes longer. */
function howItWent(customer: string, { kind, workMinutes }: DemoVisit) {
  const letters = [...customer, ...kind].reduce((sum, letter) => sum + letter.charCodeAt(0), 0);
  const isLate = letters % 9 === 0;
  return {
    lateMin: isLate ? 140 : (letters * 7) % 45,
    longerMin: Math.round((((letters * 13) % 40) - 12) * (workMinutes / 1_000)),
    confirmedHoursBefore: letters % 8 === 0 ? 1 : 70,
  };
}

function storyOf(
  shop: SeedShop,
  of: { visitId: string; customer: string; visit: DemoVisit; startsAt: Date; endsAt: Date },
): StoryLine[] {
  const { visit, startsAt, endsAt } = of;
  const day = Math.min(visit.day, 0);
  const line = (
    at: Date,
    by: StoryLine['by'],
    verb: StoryLine['verb'],
    what: string,
  ): StoryLine => ({
    at,
    by,
    verb,
    subjectKind: 'visit',
    subjectId: of.visitId,
    summary: `${visitKindWords[visit.kind]}${what}`,
  });
  const dayWords = formatDayShort(startsAt, shop.zone, { language: 'en', region: 'US' });
  const crew = crewsOfTheShop.find(({ key }) => key === visit.crew);
  const booked = ` booked for ${dayWords}, with ${crew?.name ?? visit.crew}; the customer is told by text and e-mail`;
  const first = crew?.people[0] ?? 'crew';
  const isPast = visit.day < 0;
  return [
    line(workday(shop, day - 5, '10:20'), 'scheduler', 'book-visit', booked),
    ...(visit.isConfirmed
      ? [
          line(
            workday(shop, day - 3, '12:10'),
            { customer: of.customer },
            'answer-visit',
            ': the customer says yes',
          ),
        ]
      : []),
    ...(isPast && visit.isMissed ? [line(startsAt, first, 'report-visit', ': nobody home')] : []),
    ...(isPast && !visit.isMissed
      ? [
          line(startsAt, first, 'report-visit', ': arrived'),
          line(endsAt, first, 'report-visit', ': done'),
        ]
      : []),
  ];
}
