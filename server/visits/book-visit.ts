import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { gateOverrides, jobs, visits } from '@/db/schema';
import type { BookedVisit, BookVisitInput } from '@/lib/contracts/visits';
import { stageWords } from '@/lib/schedule';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { type Context, mustBeAllowed, type PersonContext } from '@/server/base/context';
import { onlyOnce } from '@/server/base/only-once';
import { notFound, Refusal } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { kickWorker } from '@/server/messages/worker';
import { readJobRecords } from './job-records';
import { lockCrew } from './lock-crew';
import { mustPassGates, type OpenGate, planVisit } from './plan-visit';
import { readVisit } from './read-visits';
import { type Attempt, translateTakenTime } from './taken-time';
import { tellBooked, toldWords } from './tell-customer';
import { makeVisitLink } from './visit-link';
import { writePieces } from './write-pieces';

/** A visit, its pieces, its link and what the customer is told of it: all of it or nothing, and once. */
export async function bookVisit(ctx: PersonContext, input: BookVisitInput): Promise<BookedVisit> {
  mustBeAllowed(ctx, 'visits:book');
  let attempt: Attempt | null = null;
  const booked = await translateTakenTime(
    ctx,
    () => attempt,
    () =>
      ctx.db.transaction((tx) =>
        onlyOnce(tx, ctx, { verb: 'book-visit', key: input.idempotencyKey }, () =>
          write(tx, ctx, input, (planned) => {
            attempt = planned;
          }),
        ),
      ),
  );
  kickWorker();
  return booked;
}

async function write(
  tx: Transaction,
  ctx: PersonContext,
  input: BookVisitInput,
  onPlanned: (attempt: Attempt) => void,
): Promise<BookedVisit> {
  const { jobId, kind, overrideReason } = input;
  const job = await lockJob(tx, ctx, jobId);
  const crew = await lockCrew(tx, ctx, input.crewId);
  const plan = planVisit(ctx, job, crew, input);
  mustPassGates(plan.openGates, overrideReason);

  const { pieces, openGates, warnings, ...times } = plan;
  const [visit] = await tx
    .insert(visits)
    .values({ shopId: ctx.shop.id, jobId, kind, crewId: crew.id, ...times })
    .returning();
  if (!visit) throw new Error('the visit was not written');
  const personIds = crew.people.map(({ id }) => id);
  onPlanned({ visitId: visit.id, crewId: crew.id, personIds, pieces });
  await writePieces(tx, ctx, { visitId: visit.id, crew, pieces });
  await writeOverrides(tx, ctx, { visitId: visit.id, openGates, reason: overrideReason });
  if (kind === 'site-measure') await moveStage(tx, ctx, { jobId, event: 'measure-booked' });
  await makeVisitLink(tx, ctx, { visitId: visit.id, endsAt: visit.endsAt });

  const { customerId, zone } = job;
  const told = await tellBooked(tx, ctx, { ...visit, customerId, zone });
  const view = await readVisit(tx, ctx, visit.id);
  await writeAudit(tx, ctx, {
    verb: 'book-visit',
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId,
    summary: `${visitKindWords[kind]} booked for ${view.dayWords}, ${view.windowWords}, with ${crew.name}; ${toldWords(told)}${overriddenWords(openGates, overrideReason)}`,
    detail: { told, openGates, overrideReason },
  });
  return { ...view, warnings };
}

/** Two bookings of one job see each other's visits. */
export async function lockJob(tx: Transaction, ctx: Context, jobId: string) {
  await tx
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)))
    .for('update');
  const [job] = await readJobRecords(tx, ctx, eq(jobs.id, jobId));
  if (!job) throw notFound('job');
  if (job.stage === 'on-hold' || job.stage === 'called-off') {
    throw new Refusal({
      status: 409,
      code: 'job-not-open',
      message: `Not booked: the job is ${stageWords[job.stage].toLowerCase()}. Take it up first.`,
    });
  }
  return job;
}

/** Kept for good: the owner sees them in Numbers. */
export async function writeOverrides(
  tx: Transaction,
  ctx: PersonContext,
  override: { visitId: string; openGates: OpenGate[]; reason: string },
): Promise<void> {
  if (override.openGates.length === 0) return;
  mustBeAllowed(ctx, 'visits:override-gate');
  await tx.insert(gateOverrides).values(
    override.openGates.map(({ gate }) => ({
      shopId: ctx.shop.id,
      visitId: override.visitId,
      gate,
      reason: override.reason,
      byPersonId: ctx.actor.personId,
      at: ctx.now,
    })),
  );
}

export function overriddenWords(openGates: OpenGate[], reason: string): string {
  return openGates.length > 0 ? `. Booked all the same: ${reason}` : '';
}
