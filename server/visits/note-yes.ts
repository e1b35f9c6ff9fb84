import type { NoteYesInput, VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { settleItems } from '@/server/messages/scheduler-items';
import { changeVisit, lockVisit, mustBeCurrent } from './lock-visit';
import { readVisit } from './read-visits';
import { readStanding } from './visit-standing';

/** The customer said yes to the office, on the phone or in words that no program understood: nobody asks again. */
export async function noteYes(ctx: PersonContext, input: NoteYesInput): Promise<VisitView> {
  mustBeAllowed(ctx, 'visits:book');
  return ctx.db.transaction(async (tx) => {
    const before = await lockVisit(tx, ctx, input.visitId);
    await mustBeCurrent(tx, ctx, before, input.version);
    if (before.status !== 'booked') throw nothingToSay();
    const stood = await readStanding(tx, ctx, before.id);
    const yes = { status: 'confirmed', customerSays: '', confirmedAt: ctx.now } as const;
    const after = await changeVisit(tx, ctx, before, yes);
    await settleItems(tx, ctx, {
      visitId: after.id,
      settledBy: `${ctx.actor.name} has their yes.`,
      kinds: ['no-answer', 'asks-other-time', 'call-me'],
    });
    await writeAudit(tx, ctx, {
      verb: 'note-yes',
      subjectKind: 'visit',
      subjectId: after.id,
      jobId: after.jobId,
      summary: `${visitKindWords[after.kind]}: the customer said yes to the office`,
      detail: { before: stood },
    });
    return readVisit(tx, ctx, after.id);
  });
}

function nothingToSay(): Refusal {
  return new Refusal({
    status: 409,
    code: 'not-waiting-for-yes',
    message: 'Nothing was changed: this visit does not wait for a yes.',
  });
}
