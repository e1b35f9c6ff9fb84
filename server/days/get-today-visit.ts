import { and, eq } from 'drizzle-orm';
import { visits } from '@/db/schema';
import type { TodayVisit } from '@/lib/contracts/visits';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readVisits } from '@/server/visits/read-visits';
import { ofOwnCrews } from './own-crews';
import { withRooms } from './with-rooms';

/** One visit as its crew needs it on site. */
export async function getTodayVisit(
  ctx: PersonContext,
  input: { visitId: string },
): Promise<TodayVisit> {
  mustBeAllowed(ctx, 'visits:read');
  const found = await readVisits(ctx.db, ctx, and(eq(visits.id, input.visitId), ofOwnCrews(ctx)));
  const [visit] = await withRooms(ctx, found);
  if (!visit) throw notFound('visit');
  return { ...visit, drive: null };
}
