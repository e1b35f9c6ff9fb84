import { and, asc, desc, eq, inArray, lte } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { messages, people, snags, visits } from '@/db/schema';
import type { signOffFields } from '@/lib/contracts/sign-offs';
import { crewWords } from '@/lib/words/crew';
import type { DemoJob } from './demo-jobs';
import { demoStrokes } from './demo-strokes';
import type { SeedShop } from './seed-demo';

type Fields = typeof signOffFields;
/** What stood on the glass, who held it, and when. */
export type DemoSignature = { [Key in keyof Fields]: Fields[Key]['_output'] } & {
  shopId: string;
  visitId: string;
  takenBy: { personId: string; name: string };
  signedAt: Date;
};

/**
 * The customer signs at the end of the last visit that set cabinets, for what was open then. The program's own
 * verb keeps it; what it would tell the customer is taken back, since that was long ago.
 */
export async function seedSignOff(
  tx: Transaction,
  shop: SeedShop,
  { jobId, job }: { jobId: string; job: DemoJob },
): Promise<void> {
  if (job.stage !== 'signed-off' && job.stage !== 'snags') return;
  const [visit] = await tx
    .select({ id: visits.id, crewId: visits.crewId, leftAt: visits.leftAt, endsAt: visits.endsAt })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, shop.id),
        eq(visits.jobId, jobId),
        eq(visits.status, 'done'),
        inArray(visits.kind, ['install', 'return']),
      ),
    )
    .orderBy(desc(visits.endsAt))
    .limit(1);
  const [personId] =
    Object.values(shop.crews).find(({ id }) => id === visit?.crewId)?.personIds ?? [];
  if (!visit || !personId) return;
  const signedAt = visit.leftAt && visit.leftAt > visit.endsAt ? visit.leftAt : visit.endsAt;
  const [taker] = await tx
    .select({ name: people.name })
    .from(people)
    .where(and(eq(people.shopId, shop.id), eq(people.id, personId)));
  const found = await tx
    .select()
    .from(snags)
    .where(and(eq(snags.shopId, shop.id), eq(snags.jobId, jobId), lte(snags.foundAt, signedAt)))
    .orderBy(asc(snags.foundAt), asc(snags.id));
  const language = job.language ?? 'en';
  await shop.signOff(tx, {
    shopId: shop.id,
    visitId: visit.id,
    takenBy: { personId, name: taker?.name ?? '' },
    signedAt,
    name: job.customer,
    language,
    statement: crewWords[language].signStatement(shop.name),
    strokes: demoStrokes(job.customer),
    snags: found
      .filter(({ closedAt }) => closedAt === null || closedAt > signedAt)
      .map(({ id, kind, place, words, mender, dueOn }) => ({
        id,
        kind,
        place,
        words,
        mender,
        dueOn,
      })),
  });
  await tx
    .delete(messages)
    .where(
      and(
        eq(messages.shopId, shop.id),
        eq(messages.visitId, visit.id),
        eq(messages.occasion, 'done'),
      ),
    );
}
