import { and, eq } from 'drizzle-orm';
import { jobs } from '@/db/schema';
import type { SayReadyInput } from '@/lib/contracts/jobs';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { moveStage } from './move-stage';

/** The bench says that the cabinets are ready, or on which day they will be; null takes it back. */
export async function sayReady(ctx: PersonContext, input: SayReadyInput) {
  mustBeAllowed(ctx, 'sheets:say-ready');
  const { jobId, readyOn } = input;
  return ctx.db.transaction(async (tx) => {
    const [job] = await tx
      .update(jobs)
      .set({ readyOn, readySaidAt: readyOn ? ctx.now : null })
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)))
      .returning({ stage: jobs.stage });
    if (!job) throw notFound('job');
    // A day to come is a promise: the stage moves when the cabinets stand there.
    const isReadyNow = readyOn !== null && readyOn <= localDate(ctx.now, ctx.shop.zone);
    const stage = isReadyNow
      ? await moveStage(tx, ctx, { jobId, event: 'bench-says-ready' })
      : job.stage;
    await writeAudit(tx, ctx, {
      verb: 'say-ready',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary: summaryOf(ctx, readyOn, isReadyNow),
      detail: { readyOn },
    });
    return { jobId, readyOn, stage };
  });
}

function summaryOf(ctx: PersonContext, readyOn: string | null, isReadyNow: boolean): string {
  if (readyOn === null) return 'Cabinets are not ready after all';
  if (isReadyNow) return 'Cabinets are ready';
  const locale = { language: 'en', region: ctx.shop.region } as const;
  return `Cabinets will be ready on ${formatLocalDayShort(readyOn, locale)}`;
}
