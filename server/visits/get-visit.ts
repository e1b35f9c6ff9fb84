import type { VisitView } from '@/lib/contracts/visits';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readVisit } from './read-visits';

export async function getVisit(ctx: PersonContext, input: { visitId: string }): Promise<VisitView> {
  mustBeAllowed(ctx, 'visits:read');
  return readVisit(ctx.db, ctx, input.visitId);
}
