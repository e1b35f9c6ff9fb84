/** Which standing readings answer a reading asked for. */
import type { Reading } from '@/lib/contracts/readings';
import type { AskedReading } from '@/lib/measure/missing-reading';
import type { PlanContext } from '@/lib/measure/plan-context';

/** Up or down: a reading this near to the height asked for answers it. */
const NEAR_HEIGHT_MM = 150;
/** Along a wall or out of it. */
const NEAR_PLACE_MM = 250;

/** Ids of the readings that answer it, in the order taken. */
export function takenBy(context: PlanContext, ask: AskedReading): string[] {
  const near = (a: number, b: number, withinMm: number) => Math.abs(a - b) <= withinMm;
  const ids = (readings: Reading[]) => readings.map(({ id }) => id);
  switch (ask.kind) {
    case 'length':
    case 'pieces':
      return ids(
        [...context.byKind('length'), ...context.byKind('pieces')].filter(
          ({ wallId, zMm }) => wallId === ask.wallId && near(zMm, ask.zMm, NEAR_HEIGHT_MM),
        ),
      );
    case 'corner':
      return ids(
        context.byKind('corner').filter(({ cornerWallId }) => cornerWallId === ask.cornerWallId),
      );
    case 'face':
      return ids(
        context
          .byKind('face')
          .filter(
            ({ wallId, xMm, zMm }) =>
              wallId === ask.wallId &&
              near(xMm, ask.xMm, NEAR_PLACE_MM) &&
              near(zMm, ask.zMm, NEAR_HEIGHT_MM),
          ),
      );
    case 'floor':
    case 'ceiling':
      return ids(
        context
          .byKind(ask.kind)
          .filter(
            ({ wallId, xMm, yMm }) =>
              wallId === ask.wallId &&
              near(xMm, ask.xMm, NEAR_PLACE_MM) &&
              near(yMm, ask.yMm, NEAR_PLACE_MM),
          ),
      );
    case 'diagonal':
      return ids(
        context.byKind('diagonal').filter(({ fromCornerWallId, toCornerWallId }) => {
          const pair = [fromCornerWallId, toCornerWallId];
          return pair.includes(ask.fromCornerWallId) && pair.includes(ask.toCornerWallId);
        }),
      );
    case 'width':
      return ids(
        context.byKind('width').filter(({ wallId, toWallId, xMm }) => {
          const pair = [wallId, toWallId];
          const samePair = pair.includes(ask.wallId) && pair.includes(ask.toWallId);
          return samePair && (wallId !== ask.wallId || near(xMm, ask.xMm, NEAR_PLACE_MM));
        }),
      );
    case 'stud':
      return ids(
        context
          .byKind('stud')
          .filter(({ wallId }) => wallId === ask.wallId)
          .slice(ask.nth - 1),
      );
    case 'feature':
      return ids(
        context
          .byKind('feature')
          .filter(({ wallId, feature }) => wallId === ask.wallId && feature === ask.feature),
      );
    case 'doorway':
      return ids(context.byKind('doorway'));
  }
}
