import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs, sites } from '@/db/schema';
import type { ChangeJobInput } from '@/lib/contracts/jobs';
import { type Stage, stageAfter, stageByHistory } from '@/lib/schedule';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { jobHistory } from './job-history';

/** What the office learned since; only what is given is changed. */
export async function changeJob(ctx: PersonContext, input: ChangeJobInput) {
  mustBeAllowed(ctx, 'jobs:change');
  const { jobId, onHold, wayIn, ...given } = input;
  return ctx.db.transaction(async (tx) => {
    const isThisJob = and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId));
    const [before] = await tx.select().from(jobs).where(isThisJob).for('update');
    if (!before) throw notFound('job');
    const stage = await stageFor(tx, ctx, { jobId, stage: before.stage, onHold });
    const changes = { ...withoutUndefined(given), stage };
    await tx.update(jobs).set(changes).where(isThisJob);
    if (wayIn !== undefined) {
      await tx
        .update(sites)
        .set({ wayIn })
        .where(and(eq(sites.shopId, ctx.shop.id), eq(sites.id, before.siteId)));
    }
    const told = wordsFor({ ...given, wayIn, onHold });
    if (told.length > 0) {
      await writeAudit(tx, ctx, {
        verb: 'change-job',
        subjectKind: 'job',
        subjectId: jobId,
        jobId,
        summary: told.join(', '),
        detail: withoutUndefined({ ...given, wayIn, onHold }),
      });
    }
    return { jobId, stage };
  });
}

async function stageFor(
  tx: Transaction,
  ctx: PersonContext,
  job: { jobId: string; stage: Stage; onHold: boolean | undefined },
): Promise<Stage> {
  if (job.onHold === true) return stageAfter(job.stage, 'put-on-hold');
  if (job.onHold === false && job.stage === 'on-hold') {
    return stageByHistory(await jobHistory(tx, ctx, job.jobId));
  }
  return job.stage;
}

const wallWords = {
  'not-yet': 'Walls are not closed yet',
  'bare-studs': 'Walls stay bare studs for the measure',
  closed: 'Walls are closed',
} as const;

function wordsFor(given: Omit<ChangeJobInput, 'jobId'>): string[] {
  const words: string[] = [];
  if (given.title) words.push(`Now called "${given.title}"`);
  if (given.wallsReady) words.push(wallWords[given.wallsReady]);
  if (given.siteReadyOn) words.push(`Site ready on ${given.siteReadyOn}`);
  if (given.siteReadyOn === null) words.push('No day is known for the site');
  if (given.floorAgreed !== undefined) {
    words.push(given.floorAgreed ? 'Floor agreed' : 'Floor is open again');
  }
  if (given.notReady) words.push(`Not ready: ${given.notReady}`);
  if (given.notReady === '') words.push('Nothing is open from the customer any more');
  if (given.wayIn !== undefined) words.push('Way in changed');
  if (given.roomCount !== undefined) words.push(`${given.roomCount} rooms`);
  if (given.unitCount !== undefined) words.push(`${given.unitCount} units`);
  if (given.notes !== undefined) words.push('Notes changed');
  if (given.onHold === true) words.push('Put on hold');
  if (given.onHold === false) words.push('Taken up again');
  return words;
}

function withoutUndefined<T extends object>(fields: T): Partial<T> {
  return Object.fromEntries(
    Object.entries(fields).filter(([, value]) => value !== undefined),
  ) as Partial<T>;
}
