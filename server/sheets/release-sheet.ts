import type { Transaction } from '@/db/database';
import { releases } from '@/db/schema';
import type { ReleaseSheetInput } from '@/lib/contracts/rooms';
import type { Fit } from '@/lib/measure/fit';
import { fitRoom } from '@/lib/measure/fit-room';
import { standingIds } from '@/lib/measure/standing-readings';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { nextRevision } from '@/lib/sheet/next-revision';
import { openPoints } from '@/lib/sheet/open-points';
import { releaseStops } from '@/lib/sheet/release-stops';
import { type FrozenSheet, sheetChanges } from '@/lib/sheet/sheet-changes';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import { Refusal, type RefusalDetail } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { lockRoom } from '@/server/walls/lock-room';
import { type BookOnFile, readWallBook } from '@/server/walls/read-wall-book';
import { runsMark } from '@/server/walls/runs-mark';
import { readNewestFrozen } from './read-releases';

export type Released = { releaseId: string; revision: string; changes: string[] };

/** Freezes the fit as the next revision for the bench. What the releaser did not see is not released. */
export async function releaseSheet(
  ctx: PersonContext,
  input: ReleaseSheetInput,
): Promise<Released> {
  mustBeAllowed(ctx, 'sheets:release');
  return translateRefusals({ releases_revision: releasedMeanwhile }, () =>
    ctx.db.transaction(async (tx) => {
      await lockRoom(tx, ctx, input.roomId);
      const book = await readWallBook(tx, ctx, input.roomId);
      const rules = ctx.shop.rules.fit;
      const { wallBook, runs } = book;
      refuseUnseen(input, book);
      const fit = fitRoom(wallBook, runs, rules);
      refuseStopped(releaseStops(fit));
      refuseWithoutReason(input, openPoints(fit, whatIsMissing(wallBook, runs, rules)));
      const newest = await readNewestFrozen(tx, ctx, input.roomId);
      const frozen = { wallBook, runs, rules, fit };
      const changes = newest ? sheetChanges(newest, frozen) : [];
      if (newest && changes.length === 0) throw new Refusal(saysTheSame(newest.revision));
      const revision = nextRevision(newest?.revision ?? null);
      const releaseId = await freeze(tx, ctx, { input, revision, frozen, fit, changes });
      await moveStage(tx, ctx, { jobId: book.jobId, event: 'revision-released' });
      await writeAudit(tx, ctx, {
        verb: 'release-sheet',
        subjectKind: 'release',
        subjectId: releaseId,
        jobId: book.jobId,
        summary: summaryOf(wallBook.room.name, revision, input.overrideReason),
        detail: { revision, overrideReason: input.overrideReason, changes },
      });
      return { releaseId, revision, changes };
    }),
  );
}

async function freeze(
  tx: Transaction,
  ctx: PersonContext,
  release: {
    input: ReleaseSheetInput;
    revision: string;
    frozen: FrozenSheet;
    fit: Fit;
    changes: string[];
  },
): Promise<string> {
  const { input, revision, frozen, fit, changes } = release;
  const [made] = await tx
    .insert(releases)
    .values({
      shopId: ctx.shop.id,
      roomId: input.roomId,
      revision,
      engineVersion: fit.engineVersion,
      readingIds: standingIds(frozen.wallBook.readings),
      ...frozen,
      changes,
      overrideReason: input.overrideReason,
      releasedAt: ctx.now,
      releasedBy: ctx.actor.personId,
    })
    .returning({ id: releases.id });
  if (!made) throw new Error('the release was not written');
  return made.id;
}

function refuseUnseen(input: ReleaseSheetInput, { wallBook, runs }: BookOnFile): void {
  if (runs.length === 0) {
    throw new Refusal({
      status: 422,
      code: 'no-runs',
      message: 'There is no run in this room yet, so there is nothing to build. Lay one out first.',
    });
  }
  const stands = new Set(standingIds(wallBook.readings));
  const seen = new Set(input.seenReadingIds);
  const isSeen = stands.size === seen.size && [...stands].every((id) => seen.has(id));
  if (isSeen && input.seenRunsMark === runsMark(runs)) return;
  throw new Refusal({
    status: 409,
    code: 'changed-meanwhile',
    message: isSeen
      ? 'The runs were changed since you opened this fit. Nothing was released; look at it again.'
      : 'Readings came in since you opened this fit. Nothing was released; look at it again.',
  });
}

function refuseStopped(stops: string[]): void {
  const [first] = stops;
  if (first === undefined) return;
  throw new Refusal({
    status: 422,
    code: 'pieces-do-not-add-up',
    message: `${first} Take back the reading that is wrong, or measure again. Nothing was released.`,
    current: stops,
  });
}

function refuseWithoutReason(input: ReleaseSheetInput, open: string[]): void {
  if (open.length === 0 || input.overrideReason !== '') return;
  throw new Refusal({
    status: 422,
    code: 'reason-needed',
    message: 'Something is still open in this room. Say why the sheet goes out all the same.',
    errors: { overrideReason: 'Say why.' },
    current: open,
  });
}

function summaryOf(roomName: string, revision: string, overrideReason: string): string {
  const why = overrideReason ? ` with points open: ${overrideReason}` : '';
  return `Released ${roomName}, revision ${revision}${why}`;
}

const releasedMeanwhile = (): RefusalDetail => ({
  status: 409,
  code: 'released-meanwhile',
  message: 'Somebody else released this room a moment ago. Look at their revision first.',
});

const saysTheSame = (revision: string): RefusalDetail => ({
  status: 409,
  code: 'nothing-changed',
  message: `Revision ${revision} says the same already. Nothing was released.`,
});
