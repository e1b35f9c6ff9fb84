import { and, asc, eq } from 'drizzle-orm';
import {
  jobs,
  rooms,
  signOffs,
  siteChecks,
  sites,
  snags,
  visitChecks,
  visitPauses,
} from '@/db/schema';
import type { SheetView } from '@/lib/contracts/rooms';
import type { StopView } from '@/lib/contracts/stops';
import { checklistOf } from '@/lib/days/checklists';
import { may } from '@/lib/permissions';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import { localDate } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { getSheet } from '@/server/sheets/get-sheet';
import { readSignOffs } from '@/server/snags/read-sign-offs';
import { readSnags } from '@/server/snags/read-snags';
import { newestReleases } from '@/server/walls/newest-releases';
import { isVisitToday } from './is-visit-today';
import { isOfOwnCrew } from './own-crews';
import { ownVisit } from './own-visit';

/** On these a crew sets or carries what was released. */
const needsSheets: Record<VisitKind, boolean> = {
  'site-measure': false,
  'check-measure': false,
  delivery: true,
  install: true,
  'worktop-template': true,
  return: true,
};

/** What a crew needs at one stop, and what it has told of it already. */
export async function getStop(
  ctx: PersonContext,
  { visitId }: { visitId: string },
): Promise<StopView> {
  mustBeAllowed(ctx, 'visits:read');
  const { db } = ctx;
  const { id: shopId } = ctx.shop;
  const visit = await ownVisit(db, ctx, visitId);
  const [site] = await db
    .select({ parking: sites.parking, sealed: sites.accessCodeSealed, finish: jobs.finish })
    .from(jobs)
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(jobs.shopId, shopId), eq(jobs.id, visit.jobId)));
  const checks = await db
    .select({
      item: visitChecks.item,
      answer: visitChecks.answer,
      words: visitChecks.words,
      at: visitChecks.at,
    })
    .from(visitChecks)
    .where(and(eq(visitChecks.shopId, shopId), eq(visitChecks.visitId, visitId)))
    .orderBy(asc(visitChecks.at));
  const pauses = await db
    .select({ what: visitPauses.what, why: visitPauses.why, at: visitPauses.at })
    .from(visitPauses)
    .where(and(eq(visitPauses.shopId, shopId), eq(visitPauses.visitId, visitId)))
    .orderBy(asc(visitPauses.at));
  const found = await db
    .select({
      id: siteChecks.id,
      roomId: siteChecks.roomId,
      releaseId: siteChecks.releaseId,
      readings: siteChecks.readings,
      disagreements: siteChecks.disagreements,
      changes: siteChecks.changes,
      at: siteChecks.at,
    })
    .from(siteChecks)
    .where(and(eq(siteChecks.shopId, shopId), eq(siteChecks.visitId, visitId)))
    .orderBy(asc(siteChecks.at));
  const signed = await readSignOffs(db, ctx, eq(signOffs.visitId, visitId));
  const hasAccessCode = Boolean(site?.sealed);
  return {
    visitId,
    jobId: visit.jobId,
    date: localDate(ctx.now, ctx.shop.zone),
    parking: site?.parking ?? '',
    hasAccessCode,
    mayTakeCode:
      hasAccessCode &&
      may(ctx.actor.role, 'visits:report') &&
      (await isOfOwnCrew(db, ctx, visit.crewId)) &&
      (await isVisitToday(db, ctx, visit)),
    finish: site?.finish ?? '',
    sheets: needsSheets[visit.kind] ? await sheetsOf(ctx, visit.jobId) : [],
    checklist: checklistOf(visit.kind, ctx.shop.rules.checklists),
    checks: [
      ...new Map(checks.map((one) => [one.item, { ...one, at: one.at.toISOString() }])).values(),
    ],
    pauses: pauses.map((one) => ({ ...one, at: one.at.toISOString() })),
    snags: await readSnags(db, ctx, eq(snags.jobId, visit.jobId)),
    asFound: found.map((one) => ({ ...one, at: one.at.toISOString() })),
    signOff: signed[0] ?? null,
  };
}

/** The newest sheet of each room of the job. */
async function sheetsOf(ctx: PersonContext, jobId: string): Promise<SheetView[]> {
  const ofJob = await ctx.db
    .select({ id: rooms.id })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.jobId, jobId)))
    .orderBy(asc(rooms.position), asc(rooms.createdAt), asc(rooms.id));
  const newest = await newestReleases(
    ctx.db,
    ctx,
    ofJob.map(({ id }) => id),
  );
  const sheets: SheetView[] = [];
  for (const { id: roomId } of ofJob) {
    const revision = newest.get(roomId)?.revision;
    if (revision) sheets.push(await getSheet(ctx, { roomId, revision }));
  }
  return sheets;
}
