import { and, eq } from 'drizzle-orm';
import { visits } from '@/db/schema';
import type { HoldForCustomerInput } from '@/lib/contracts/openings';
import type { CustomerContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { writeHold } from './hold-opening';
import { offerTimes } from './offer-times';
import { type Attempt, translateTakenTime } from './taken-time';

/**
 * Keeps an offered time for the customer while they decide. Only what is offered can be kept: a day or hour
 * that was made up in the request is refused like one that somebody else just took. Which crew comes is settled here.
 */
export async function holdForCustomer(
  ctx: CustomerContext,
  input: HoldForCustomerInput,
): Promise<void> {
  const { times } = await offerTimes(ctx);
  const offered = times.find(({ date, time }) => date === input.date && time === input.time);
  if (!offered) throw justTaken();
  const [visit] = await ctx.db
    .select({ jobId: visits.jobId, kind: visits.kind, workMinutes: visits.workMinutes })
    .from(visits)
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, ctx.actor.visitId)));
  if (!visit) throw notFound('visit');
  let attempt: Attempt | null = null;
  const hold = () =>
    ctx.db.transaction((tx) =>
      writeHold(
        tx,
        ctx,
        {
          ...visit,
          ...input,
          crewId: offered.crewId,
          forVisitId: ctx.actor.visitId,
          overrideReason: '',
        },
        (planned) => {
          attempt = planned;
        },
      ),
    );
  try {
    await translateTakenTime(ctx, () => attempt, hold);
  } catch (error) {
    // Whose visit stands there is nobody else's business.
    if (error instanceof Refusal && error.refusal.code === 'crew-already-booked') throw justTaken();
    throw error;
  }
}

function justTaken(): Refusal {
  return new Refusal({
    status: 409,
    code: 'time-just-taken',
    message: 'Nothing was changed: somebody just took this time. Choose another one.',
  });
}
