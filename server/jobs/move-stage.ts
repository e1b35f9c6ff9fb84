import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs } from '@/db/schema';
import { type Stage, type StageEvent, stageAfter } from '@/lib/schedule';
import type { Context } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Moves a job along its chain because something happened, in the transaction of what happened. */
export async function moveStage(
  tx: Transaction,
  ctx: Context,
  move: { jobId: string; event: StageEvent },
): Promise<Stage> {
  const [job] = await tx
    .select({ stage: jobs.stage })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, move.jobId)))
    .for('update');
  if (!job) throw notFound('job');
  const stage = stageAfter(job.stage, move.event);
  if (stage !== job.stage) {
    await tx
      .update(jobs)
      .set({ stage })
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, move.jobId)));
  }
  return stage;
}
