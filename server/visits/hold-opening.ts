import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { visits } from '@/db/schema';
import { type HeldVisit, type HoldOpeningInput, holdMinutes } from '@/lib/contracts/openings';
import { type Context, mustBeAllowed, type PersonContext } from '@/server/base/context';
import { onlyOnce } from '@/server/base/only-once';
import { notFound } from '@/server/base/problem-response';
import { lockJob, writeOverrides } from './book-visit';
import { insertHold } from './insert-hold';
import { lockCrew } from './lock-crew';
import { lockVisit } from './lock-visit';
import { mustPassGates, planVisit } from './plan-visit';
import { readVisit } from './read-visits';
import { type Attempt, translateTakenTime } from './taken-time';
import { mustBeMovable } from './write-move';
import { writePieces } from './write-pieces';

/** Keeps a time for a quarter of an hour for somebody who is choosing. Nobody is told; another choice frees it. */
export async function holdOpening(ctx: PersonContext, input: HoldOpeningInput): Promise<HeldVisit> {
  mustBeAllowed(ctx, 'visits:book');
  let attempt: Attempt | null = null;
  return translateTakenTime(
    ctx,
    () => attempt,
    () =>
      ctx.db.transaction((tx) =>
        onlyOnce(tx, ctx, { verb: 'hold-opening', key: input.idempotencyKey }, async () => {
          const held = await writeHold(tx, ctx, input, (planned) => {
            attempt = planned;
          });
          await writeOverrides(tx, ctx, {
            visitId: held.visitId,
            openGates: held.openGates,
            reason: input.overrideReason,
          });
          const view = await readVisit(tx, ctx, held.visitId);
          return {
            ...view,
            warnings: held.warnings,
            holdEndsAt: held.holdEndsAt.toISOString(),
          };
        }),
      ),
  );
}

/** The held visit with its pieces, in place of what was held for the same before. */
export async function writeHold(
  tx: Transaction,
  ctx: Context,
  input: Omit<HoldOpeningInput, 'idempotencyKey'>,
  onPlanned: (attempt: Attempt) => void,
) {
  const { jobId, kind, forVisitId, overrideReason } = input;
  const job = await lockJob(tx, ctx, jobId);
  const moved = forVisitId ? await lockVisit(tx, ctx, forVisitId) : null;
  if (moved) {
    if (moved.jobId !== jobId || moved.kind !== kind) throw notFound('visit');
    mustBeMovable(moved);
  }
  const crew = await lockCrew(tx, ctx, input.crewId);
  const workMinutes = input.workMinutes ?? moved?.workMinutes;
  const plan = planVisit(ctx, job, crew, { ...input, workMinutes });
  mustPassGates(plan.openGates, overrideReason);
  await letGo(tx, ctx, { jobId, kind, forVisitId: forVisitId ?? null });

  const { pieces, openGates, warnings, ...times } = plan;
  const holdEndsAt = new Date(ctx.now.getTime() + holdMinutes * 60_000);
  const visitId = await insertHold(tx, ctx, {
    jobId,
    kind,
    crewId: crew.id,
    holdEndsAt,
    heldForVisitId: forVisitId ?? null,
    ...times,
  });
  const personIds = crew.people.map(({ id }) => id);
  onPlanned({ visitId, crewId: crew.id, personIds, pieces });
  await writePieces(tx, ctx, { visitId, crew, pieces });
  return { visitId, holdEndsAt, openGates, warnings };
}

/** One hold for one need: a customer who looks at a third time no longer keeps the second. */
async function letGo(
  tx: Transaction,
  ctx: Context,
  need: { jobId: string; kind: HoldOpeningInput['kind']; forVisitId: string | null },
): Promise<void> {
  await tx
    .delete(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.jobId, need.jobId),
        eq(visits.kind, need.kind),
        eq(visits.status, 'held'),
        need.forVisitId
          ? eq(visits.heldForVisitId, need.forVisitId)
          : isNull(visits.heldForVisitId),
      ),
    );
}
