import { and, eq } from 'drizzle-orm';
import { jobs, sites } from '@/db/schema';
import type { ForCrewInput } from '@/lib/contracts/stops';
import { writeAudit } from '@/server/base/audit';
import { type Context, mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { sealText } from '@/server/base/sealed-text';

/** What the office tells the crew: parking, finish, and the access code, which is sealed at once. */
export async function setForCrew(
  ctx: PersonContext,
  { jobId, parking, finish, accessCode }: ForCrewInput,
): Promise<{ jobId: string }> {
  mustBeAllowed(ctx, 'jobs:change');
  return ctx.db.transaction(async (tx) => {
    const [job] = await tx
      .select({ siteId: jobs.siteId })
      .from(jobs)
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)))
      .for('update');
    if (!job) throw notFound('job');
    const { siteId } = job;
    const ofSite = {
      ...(parking === undefined ? {} : { parking }),
      ...(accessCode === undefined ? {} : sealed(ctx, siteId, accessCode)),
    };
    if (Object.keys(ofSite).length > 0) {
      await tx
        .update(sites)
        .set(ofSite)
        .where(and(eq(sites.shopId, ctx.shop.id), eq(sites.id, siteId)));
    }
    if (finish !== undefined) {
      await tx
        .update(jobs)
        .set({ finish })
        .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
    }
    const told = [
      ...(parking === undefined ? [] : ['Parking changed']),
      ...(finish === undefined ? [] : [finish ? `Finish: ${finish}` : 'No finish is known']),
      ...(accessCode === undefined
        ? []
        : [accessCode ? 'A new access code is kept' : 'The access code was taken away']),
    ];
    if (told.length > 0) {
      await writeAudit(tx, ctx, {
        verb: 'set-for-crew',
        subjectKind: 'job',
        subjectId: jobId,
        jobId,
        summary: told.join(', '),
      });
    }
    return { jobId };
  });
}

/** Bound to its shop and site: the sealed text opens nowhere else. */
export function codeBelongsTo(ctx: Context, siteId: string): string {
  return `access code of ${ctx.shop.id}/${siteId}`;
}

function sealed(ctx: PersonContext, siteId: string, accessCode: string) {
  if (accessCode === '') return { accessCodeSealed: null, accessCodeSetAt: null };
  return {
    accessCodeSealed: sealText(accessCode, codeBelongsTo(ctx, siteId)),
    accessCodeSetAt: ctx.now,
  };
}
