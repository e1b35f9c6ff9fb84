import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { crewPeople, daysOff, people } from '@/db/schema';
import type { AddDaysOffInput, CrewChange, RemoveDaysOffInput } from '@/lib/contracts/crews';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { writeAudit } from '@/server/base/audit';
import type { Shop } from '@/server/base/context';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { mustBeOurPeople } from '@/server/shops/own-people';
import { keepOrTry } from './keep-or-try';
import { settlePeople } from './settle-people';
import { newlyOutside, visitsOutside } from './visits-outside';

/** A person is off from a day to a day. The visits of their crews stay, and are told. */
export async function addDaysOff(ctx: PersonContext, input: AddDaysOffInput): Promise<CrewChange> {
  mustBeAllowed(ctx, 'crews:change');
  const { isTrial, ...days } = input;
  return keepOrTry(ctx, isTrial, async (tx) => {
    await mustBeOurPeople(tx, ctx, [days.personId]);
    const crewIds = await crewsOf(tx, ctx, days.personId);
    const before = crewIds.length > 0 ? await visitsOutside(tx, ctx, crewIds) : [];
    await tx.insert(daysOff).values({ shopId: ctx.shop.id, ...days });
    await settlePeople(tx, ctx, crewIds);
    await writeAudit(tx, ctx, {
      verb: 'add-days-off',
      subjectKind: 'person',
      subjectId: days.personId,
      summary: `${await nameOf(tx, ctx, days.personId)} is off, ${daysWords(ctx.shop, days)}`,
    });
    const after = crewIds.length > 0 ? await visitsOutside(tx, ctx, crewIds) : [];
    return { isKept: !isTrial, newlyOutside: newlyOutside(before, after) };
  });
}

/** They work after all; where they go with a crew that is booked then, they are booked again. */
export async function removeDaysOff(ctx: PersonContext, input: RemoveDaysOffInput) {
  mustBeAllowed(ctx, 'crews:change');
  return ctx.db.transaction(async (tx) => {
    const [removed] = await tx
      .delete(daysOff)
      .where(and(eq(daysOff.shopId, ctx.shop.id), eq(daysOff.id, input.daysOffId)))
      .returning();
    if (!removed) throw notFound('day off');
    await settlePeople(tx, ctx, await crewsOf(tx, ctx, removed.personId));
    await writeAudit(tx, ctx, {
      verb: 'remove-days-off',
      subjectKind: 'person',
      subjectId: removed.personId,
      summary: `${await nameOf(tx, ctx, removed.personId)} works after all, ${daysWords(ctx.shop, removed)}`,
    });
    return { daysOffId: removed.id };
  });
}

export function daysWords(
  shop: Pick<Shop, 'region'>,
  { firstDay, lastDay }: { firstDay: string; lastDay: string },
): string {
  const locale = { language: 'en', region: shop.region } as const;
  const first = formatLocalDayShort(firstDay, locale);
  return firstDay === lastDay ? first : `${first} to ${formatLocalDayShort(lastDay, locale)}`;
}

async function crewsOf(tx: Transaction, ctx: PersonContext, personId: string): Promise<string[]> {
  const found = await tx
    .select({ crewId: crewPeople.crewId })
    .from(crewPeople)
    .where(and(eq(crewPeople.shopId, ctx.shop.id), eq(crewPeople.personId, personId)));
  return found.map(({ crewId }) => crewId);
}

async function nameOf(tx: Transaction, ctx: PersonContext, personId: string): Promise<string> {
  const [found] = await tx
    .select({ name: people.name })
    .from(people)
    .where(and(eq(people.shopId, ctx.shop.id), eq(people.id, personId)));
  return found?.name ?? 'Somebody';
}
