import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { crewPeople, crews } from '@/db/schema';
import type { ChangeCrewInput, CrewChange } from '@/lib/contracts/crews';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import { crewNameTaken } from '@/server/shops/create-crew';
import { mustBeOurPeople } from '@/server/shops/own-people';
import { keepOrTry } from './keep-or-try';
import { lockCrew } from './lock-crew';
import { settlePeople } from './settle-people';
import { newlyOutside, visitsOutside } from './visits-outside';

/** A crew as it is from now on. Visits that it leaves outside its days stay where they are, and are told. */
export async function changeCrew(ctx: PersonContext, input: ChangeCrewInput): Promise<CrewChange> {
  mustBeAllowed(ctx, 'crews:change');
  const { crewId, isTrial } = input;
  return translateRefusals({ crews_name: () => crewNameTaken(input.name ?? '') }, () =>
    keepOrTry(ctx, isTrial, async (tx) => {
      const { name } = await lockCrew(tx, ctx, crewId);
      const before = await visitsOutside(tx, ctx, [crewId]);
      const told = await write(tx, ctx, input);
      if (input.members) await settlePeople(tx, ctx, [crewId]);
      if (told.length > 0) {
        await writeAudit(tx, ctx, {
          verb: 'change-crew',
          subjectKind: 'crew',
          subjectId: crewId,
          summary: `Crew ${input.name ?? name}: ${told.join(', ')} changed`,
        });
      }
      const after = await visitsOutside(tx, ctx, [crewId]);
      return { isKept: !isTrial, newlyOutside: newlyOutside(before, after) };
    }),
  );
}

/** Only what is given; says in words what that was. */
async function write(
  tx: Transaction,
  ctx: PersonContext,
  { crewId, isTrial, members, base, ...plain }: ChangeCrewInput,
): Promise<string[]> {
  const shopId = ctx.shop.id;
  const given = {
    ...plain,
    ...(base
      ? {
          baseAddress: base.address,
          baseLatitude: base.place?.lat ?? null,
          baseLongitude: base.place?.lon ?? null,
        }
      : {}),
  };
  const isGiven = Object.values(given).some((value) => value !== undefined);
  if (isGiven) {
    await tx
      .update(crews)
      .set(given)
      .where(and(eq(crews.shopId, shopId), eq(crews.id, crewId)));
  }
  if (members) {
    await mustBeOurPeople(
      tx,
      ctx,
      members.map(({ personId }) => personId),
    );
    await tx
      .delete(crewPeople)
      .where(and(eq(crewPeople.shopId, shopId), eq(crewPeople.crewId, crewId)));
    const byPerson = new Map(members.map((member) => [member.personId, member]));
    if (byPerson.size > 0) {
      await tx
        .insert(crewPeople)
        .values([...byPerson.values()].map((member) => ({ shopId, crewId, ...member })));
    }
  }
  const { name, does, colour, kinds, pattern } = plain;
  const words: [unknown, string][] = [
    [name, 'name'],
    [does ?? kinds, 'what it does'],
    [colour, 'colour'],
    [pattern, 'days and hours'],
    [base, 'base'],
    [members, 'people'],
  ];
  return words.flatMap(([value, word]) => (value === undefined ? [] : [word]));
}
