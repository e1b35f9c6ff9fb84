import { and, eq } from 'drizzle-orm';
import { runs, units } from '@/db/schema';
import type { SaveRunsInput } from '@/lib/contracts/rooms';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import { Refusal, type RefusalDetail } from '@/server/base/problem-response';
import { lockRoom } from './lock-room';
import { readWallBook } from './read-wall-book';
import { runsMark } from './runs-mark';
import { runsProblem } from './runs-problem';

/** Puts the runs of a room in place of those it has: all of them or none. */
export async function saveRuns(
  ctx: PersonContext,
  input: SaveRunsInput,
): Promise<{ runsMark: string }> {
  mustBeAllowed(ctx, 'runs:change');
  return translateRefusals({ runs_pkey: idTaken, units_pkey: idTaken }, () =>
    ctx.db.transaction(async (tx) => {
      await lockRoom(tx, ctx, input.roomId);
      const before = await readWallBook(tx, ctx, input.roomId);
      const problem = runsProblem(before.wallBook.room, input.runs);
      if (problem) throw new Refusal(problem);
      if (input.seenRunsMark && input.seenRunsMark !== runsMark(before.runs)) {
        throw new Refusal({
          status: 409,
          code: 'runs-changed-meanwhile',
          message: 'Somebody else changed these runs meanwhile. Yours are kept on this screen.',
          current: before.runs,
        });
      }
      // Units go with their runs.
      await tx.delete(runs).where(and(eq(runs.shopId, ctx.shop.id), eq(runs.roomId, input.roomId)));
      for (const [position, run] of input.runs.entries()) {
        const { id, wallId, name, units: ofRun, ...body } = run;
        await tx
          .insert(runs)
          .values({ shopId: ctx.shop.id, id, roomId: input.roomId, wallId, position, name, body });
        if (ofRun.length === 0) continue;
        await tx.insert(units).values(
          ofRun.map((unit, place) => ({
            shopId: ctx.shop.id,
            runId: id,
            position: place,
            ...unit,
          })),
        );
      }
      await writeAudit(tx, ctx, {
        verb: 'save-runs',
        subjectKind: 'room',
        subjectId: input.roomId,
        jobId: before.jobId,
        summary: `Laid out the runs of ${before.wallBook.room.name}: ${inWords(input.runs)}`,
      });
      return { runsMark: runsMark(input.runs) };
    }),
  );
}

function inWords(list: SaveRunsInput['runs']): string {
  const unitCount = list.reduce((sum, run) => sum + run.units.length, 0);
  const plural = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;
  return `${plural(list.length, 'run')}, ${plural(unitCount, 'unit')}`;
}

const idTaken = (): RefusalDetail => ({
  status: 409,
  code: 'id-taken',
  message: 'A run or unit with this id is in another room. Nothing was changed.',
});
