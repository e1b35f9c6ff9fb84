import { and, eq } from 'drizzle-orm';
import { jobs, sites } from '@/db/schema';
import type { AccessCodeView } from '@/lib/contracts/stops';
import { localDate } from '@/lib/time/local-moment';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { openText } from '@/server/base/sealed-text';
import { isVisitToday } from './is-visit-today';
import { isOfOwnCrew } from './own-crews';
import { ownVisit } from './own-visit';
import { codeBelongsTo } from './set-for-crew';

/**
 * The access code of a site, for the crew of a visit there and on the days of the visit alone. That it went
 * on to a phone is in the audit; each look at it there comes after as an event of its own.
 */
export async function getAccessCode(
  ctx: PersonContext,
  { visitId }: { visitId: string },
): Promise<AccessCodeView> {
  mustBeAllowed(ctx, 'visits:report');
  return ctx.db.transaction(async (tx) => {
    const visit = await ownVisit(tx, ctx, visitId);
    // The office sees every visit, and no code: it is for who stands at the door.
    if (!(await isOfOwnCrew(tx, ctx, visit.crewId))) throw notFound('visit');
    const date = localDate(ctx.now, ctx.shop.zone);
    if (!(await isVisitToday(tx, ctx, visit))) throw notToday();
    const [site] = await tx
      .select({ id: sites.id, sealed: sites.accessCodeSealed })
      .from(jobs)
      .innerJoin(sites, eq(sites.id, jobs.siteId))
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, visit.jobId)));
    if (!site?.sealed) throw notFound('access code');
    const code = openText(site.sealed, codeBelongsTo(ctx, site.id));
    if (code === null) throw doesNotOpen();
    await writeAudit(tx, ctx, {
      verb: 'take-access-code',
      subjectKind: 'visit',
      subjectId: visitId,
      jobId: visit.jobId,
      summary: 'The access code went on to the crew’s phone for the day',
    });
    return { visitId, date, code };
  });
}

function notToday(): Refusal {
  return new Refusal({
    status: 403,
    code: 'not-today',
    message: 'The code is shown on the day of the visit alone. Ring the office if you need it now.',
  });
}

function doesNotOpen(): Refusal {
  return new Refusal({
    status: 409,
    code: 'code-lost',
    message:
      'The code cannot be read with the key that this server has. Ask the office to type it again.',
  });
}
