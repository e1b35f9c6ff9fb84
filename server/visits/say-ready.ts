import { and, asc, eq, gt, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs, visits } from '@/db/schema';
import type { SayReadyInput } from '@/lib/contracts/jobs';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { putItem } from '@/server/messages/scheduler-items';

/**
 * The bench says that the cabinets are ready and where they stand, or on which day they will be and why not
 * sooner; null takes it back. Later than the booked install, it is put before the scheduler.
 */
export async function sayReady(ctx: PersonContext, input: SayReadyInput) {
  mustBeAllowed(ctx, 'sheets:say-ready');
  const { jobId, readyOn, where = '', why = '' } = input;
  return ctx.db.transaction(async (tx) => {
    const [job] = await tx
      .update(jobs)
      .set({
        readyOn,
        readySaidAt: readyOn ? ctx.now : null,
        readyWhere: where,
        readyWhy: why,
      })
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)))
      .returning({ stage: jobs.stage, number: jobs.number, customerId: jobs.customerId });
    if (!job) throw notFound('job');
    // A day to come is a promise: the stage moves when the cabinets stand there.
    const isReadyNow = readyOn !== null && readyOn <= localDate(ctx.now, ctx.shop.zone);
    const stage = isReadyNow
      ? await moveStage(tx, ctx, { jobId, event: 'bench-says-ready' })
      : job.stage;
    const summary = summaryOf(ctx, input, isReadyNow);
    await writeAudit(tx, ctx, {
      verb: 'say-ready',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary,
      detail: { readyOn },
    });
    const install = readyOn === null ? null : await nextInstall(tx, ctx, jobId);
    if (readyOn !== null && install && readyOn > localDate(install.startsAt, ctx.shop.zone)) {
      await putItem(tx, {
        shopId: ctx.shop.id,
        customerId: job.customerId,
        jobId,
        visitId: install.id,
        kind: 'cabinets-late',
        key: `cabinets-late:${install.id}:${readyOn}`,
        words: `Job ${job.number}: ${summary}; the install is booked for ${dayWords(ctx, localDate(install.startsAt, ctx.shop.zone))}`,
        at: ctx.now,
      });
    }
    return { jobId, readyOn, stage };
  });
}

/** The first install that is still to come. */
async function nextInstall(tx: Transaction, ctx: PersonContext, jobId: string) {
  const [install] = await tx
    .select({ id: visits.id, startsAt: visits.startsAt })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.jobId, jobId),
        eq(visits.kind, 'install'),
        inArray(visits.status, ['held', 'booked', 'confirmed']),
        gt(visits.endsAt, ctx.now),
      ),
    )
    .orderBy(asc(visits.startsAt))
    .limit(1);
  return install ?? null;
}

function summaryOf(
  ctx: PersonContext,
  { readyOn, where, why }: SayReadyInput,
  isReadyNow: boolean,
): string {
  if (readyOn === null) return 'Cabinets are not ready after all';
  if (isReadyNow) return `Cabinets are ready${where ? `: ${where}` : ''}`;
  return `Cabinets will be ready on ${dayWords(ctx, readyOn)}${why ? `: ${why}` : ''}`;
}

function dayWords(ctx: PersonContext, date: string): string {
  return formatLocalDayShort(date, { language: 'en', region: ctx.shop.region });
}
