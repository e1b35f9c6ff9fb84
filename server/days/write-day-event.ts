import type { Transaction } from '@/db/database';
import type { DayEvent } from '@/lib/contracts/day-events';
import { may } from '@/lib/permissions';
import type { PersonContext } from '@/server/base/context';
import { refused } from '@/server/base/problem-response';
import { writeClosing } from '@/server/snags/write-closing';
import { writeSignOff } from '@/server/snags/write-sign-off';
import { writeSnag } from '@/server/snags/write-snag';
import { ownVisit } from './own-visit';
import { writeAsFound } from './write-as-found';
import { writeCheck } from './write-check';
import { writeCodeSeen } from './write-code-seen';
import { writePause } from './write-pause';

/** One tap, in the transaction of what it does; told twice it does it once. */
export async function writeDayEvent(
  tx: Transaction,
  ctx: PersonContext,
  event: DayEvent,
): Promise<void> {
  const visit = await ownVisit(tx, ctx, event.visitId);
  // A phone's clock may be ahead of ours.
  const at = new Date(Math.min(Date.parse(event.at), ctx.now.getTime()));
  switch (event.what) {
    case 'pause':
    case 'go-on':
      return writePause(tx, ctx, { event, visit, at });
    case 'check':
      return writeCheck(tx, ctx, { event, visit, at });
    case 'snag':
      mustChangeSnags(ctx);
      return writeSnag(tx, ctx, { ...event, jobId: visit.jobId, foundAt: at });
    case 'close-snag':
      mustChangeSnags(ctx);
      return writeClosing(tx, ctx, { ...event, at, ofJobId: visit.jobId });
    case 'as-found':
      return writeAsFound(tx, ctx, { event, visit, at });
    case 'sign-off':
      return writeSignOff(tx, ctx, event, at);
    case 'code-seen':
      return writeCodeSeen(tx, ctx, { event, visit, at });
  }
}

function mustChangeSnags(ctx: PersonContext): void {
  if (!may(ctx.actor.role, 'snags:change')) throw refused();
}
