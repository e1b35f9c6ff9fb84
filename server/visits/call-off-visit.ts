import type { CallOffVisitInput, VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { kickWorker } from '@/server/messages/worker';
import { changeVisit, lockVisit, mustBeCurrent } from './lock-visit';
import { readVisit } from './read-visits';
import { tellCalledOff, toldWords } from './tell-customer';
import { readStanding } from './visit-standing';
import { removePieces } from './write-pieces';

/** The crew's time is free again; the visit stays in the story, and its customer is told. */
export async function callOffVisit(
  ctx: PersonContext,
  input: CallOffVisitInput,
): Promise<VisitView> {
  mustBeAllowed(ctx, 'visits:book');
  const view = await ctx.db.transaction(async (tx) => {
    const before = await lockVisit(tx, ctx, input.visitId);
    await mustBeCurrent(tx, ctx, before, input.version);
    if (['done', 'missed', 'called-off'].includes(before.status)) throw over();
    const stood = await readStanding(tx, ctx, before.id);
    const after = await changeVisit(tx, ctx, before, { status: 'called-off', confirmedAt: null });
    await removePieces(tx, ctx, after.id);
    const told = await tellCalledOff(tx, ctx, after, input.reason);
    const visit = await readVisit(tx, ctx, after.id);
    await writeAudit(tx, ctx, {
      verb: 'call-off-visit',
      subjectKind: 'visit',
      subjectId: after.id,
      jobId: after.jobId,
      summary: `${visitKindWords[after.kind]} of ${visit.dayWords} called off: ${input.reason}; ${toldWords(told)}`,
      detail: { before: stood, told, reason: input.reason },
    });
    return visit;
  });
  kickWorker();
  return view;
}

function over(): Refusal {
  return new Refusal({
    status: 409,
    code: 'visit-over',
    message: 'Nothing was changed: this visit is over already.',
  });
}
