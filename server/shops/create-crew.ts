import { and, eq, inArray, isNull } from 'drizzle-orm';
import { crewPeople, crews, people } from '@/db/schema';
import type { CreateCrewInput } from '@/lib/contracts/visits';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import { notFound } from '@/server/base/problem-response';

/** A fitting crew, or one measurer. */
export async function createCrew(ctx: PersonContext, input: CreateCrewInput) {
  mustBeAllowed(ctx, 'crews:change');
  const { personIds, ...crew } = input;
  const shopId = ctx.shop.id;
  const crewId = await translateRefusals({ crews_name: () => nameTaken(crew.name) }, () =>
    ctx.db.transaction(async (tx) => {
      const members = personIds.length
        ? await tx
            .select({ id: people.id })
            .from(people)
            .where(
              and(eq(people.shopId, shopId), inArray(people.id, personIds), isNull(people.leftAt)),
            )
        : [];
      if (members.length < new Set(personIds).size) throw notFound('person');
      const [made] = await tx
        .insert(crews)
        .values({ shopId, ...crew })
        .returning({ id: crews.id });
      if (!made) throw new Error('the crew was not written');
      if (members.length > 0) {
        await tx
          .insert(crewPeople)
          .values(members.map(({ id }) => ({ shopId, crewId: made.id, personId: id })));
      }
      await writeAudit(tx, ctx, {
        verb: 'create-crew',
        subjectKind: 'crew',
        subjectId: made.id,
        summary: `Crew ${crew.name} made, ${members.length} people`,
      });
      return made.id;
    }),
  );
  return { id: crewId };
}

function nameTaken(name: string) {
  return {
    status: 409 as const,
    code: 'crew-name-taken',
    message: `There is a crew called ${name} already.`,
    errors: { name: 'There is a crew of this name.' },
  };
}
