import { crewPeople, crews } from '@/db/schema';
import type { CreateCrewInput } from '@/lib/contracts/visits';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import { mustBeOurPeople } from './own-people';

/** A fitting crew, or one measurer. */
export async function createCrew(ctx: PersonContext, input: CreateCrewInput) {
  mustBeAllowed(ctx, 'crews:change');
  const { personIds: named, ...crew } = input;
  const personIds = [...new Set(named)];
  const shopId = ctx.shop.id;
  const crewId = await translateRefusals({ crews_name: () => crewNameTaken(crew.name) }, () =>
    ctx.db.transaction(async (tx) => {
      await mustBeOurPeople(tx, ctx, personIds);
      const [made] = await tx
        .insert(crews)
        .values({ shopId, ...crew })
        .returning({ id: crews.id });
      if (!made) throw new Error('the crew was not written');
      if (personIds.length > 0) {
        await tx
          .insert(crewPeople)
          .values(personIds.map((personId) => ({ shopId, crewId: made.id, personId })));
      }
      await writeAudit(tx, ctx, {
        verb: 'create-crew',
        subjectKind: 'crew',
        subjectId: made.id,
        summary: `Crew ${crew.name} made, ${personIds.length} people`,
      });
      return made.id;
    }),
  );
  return { id: crewId };
}

export function crewNameTaken(name: string) {
  return {
    status: 409 as const,
    code: 'crew-name-taken',
    message: `There is a crew called ${name} already.`,
    errors: { name: 'There is a crew of this name.' },
  };
}
