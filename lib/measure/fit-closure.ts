/** Whether the room holds together: what checks what, the suspect, what would settle it. */
import type { AdjustedRoom, FurtherReading } from '@/lib/measure/adjusted-room';
import { type Blunder, findBlunder } from '@/lib/measure/find-blunder';
import { fitChains } from '@/lib/measure/fit-chains';
import type { FitContext } from '@/lib/measure/fit-context';
import { isDrawnOnly } from '@/lib/measure/observe-room';
import { diagonalSlot } from '@/lib/measure/plan-across';
import { planHeight } from '@/lib/measure/plan-context';
import { observationWords } from '@/lib/measure/reading-words';
import type {
  CheckedReading,
  RoomAdjustment,
  RoomClosure,
  SettleStep,
  Suspect,
} from '@/lib/measure/room-closure';
import type { RoomObservation } from '@/lib/measure/room-observations';
import { settle } from '@/lib/measure/settle';
import { lengthUncertainty } from '@/lib/measure/uncertainty';

/**
 * Chains, adjustment, suspect and the readings that would settle it, in words.
 * Edge: what is only drawn takes part in the adjustment and is never shown as a reading or a suspect.
 */
export function fitClosure(context: FitContext): RoomClosure {
  const { room } = context;
  const chains = fitChains(context);
  if (!room) {
    const words = 'There is too little read to lay the room out.';
    return { chains, adjustment: null, words, suspect: null, settle: [] };
  }
  const blunder = findBlunder(room);
  const suspect = blunder ? suspectOf(context, room, blunder) : null;
  const suspects = suspect && blunder ? blunder.suspects.map(({ observation }) => observation) : [];
  return {
    chains,
    adjustment: adjustmentOf(context, room),
    words: closureWords(room, suspect),
    suspect,
    settle: settleSteps(context, room, suspects),
  };
}

function isRead({ observation }: AdjustedRoom['checks'][number]): boolean {
  return !isDrawnOnly(observation);
}

function adjustmentOf(context: FitContext, room: AdjustedRoom): RoomAdjustment {
  return {
    corners: room.corners.map(({ cornerWallId, afterWallId, xMm, yMm, ellipse }) => ({
      cornerWallId,
      afterWallId,
      xMm,
      yMm,
      ellipse,
    })),
    chiSquare: room.chiSquare,
    observations: room.checks.filter(isRead).map((check): CheckedReading => {
      const isPlumb = check.observation.kind === 'plumb';
      // A lean is shown in mm per metre, where its numbers can be read.
      const scale = isPlumb ? 1_000 : 1;
      return {
        readingIds: check.observation.readingIds,
        words: observationWords(context.walk, context.rules, check.observation),
        unit: check.observation.kind === 'corner' ? 'deg' : isPlumb ? 'mm/m' : 'mm',
        read: check.read * scale,
        adjusted: check.adjusted * scale,
        residual: check.residual * scale,
        w: check.w,
        redundancy: check.redundancy,
        smallestSlip:
          check.hardlyChecked || check.smallestSlip === null ? null : check.smallestSlip * scale,
        tellable: check.tellable,
      };
    }),
  };
}

function closureWords(room: AdjustedRoom, suspect: Suspect | null): string {
  if (suspect) return suspect.words;
  const unread = room.checks.filter((check) => !isRead(check));
  if (unread.length > 0) return 'The room is not read through yet: parts are only drawn.';
  const weakest = room.checks.filter(isRead).filter(({ hardlyChecked }) => hardlyChecked);
  if (weakest.length > 0) {
    return `Nothing speaks against the readings, but hardly anything checks ${weakest.length} of them. One more reading would.`;
  }
  return 'The readings hold together.';
}

function suspectOf(context: FitContext, room: AdjustedRoom, blunder: Blunder): Suspect | null {
  const named = blunder.suspects.filter(({ readingIds }) => readingIds.length > 0);
  const readings = named.map(({ observation, readingIds, slip, unit, known }) => ({
    readingIds,
    words: observationWords(context.walk, context.rules, observationAt(room, observation)),
    slip: unit === 'mm/mm' ? slip * 1_000 : slip,
    unit: unit === 'mm/mm' ? ('mm/m' as const) : unit,
    known,
  }));
  const first = readings[0];
  if (!first) return null;
  return { readings, words: suspectWords(context, first, readings.length - 1) };
}

function observationAt(room: AdjustedRoom, index: number): RoomObservation {
  const observation = room.system.observations[index];
  if (!observation) throw new RangeError(`No observation ${index} in the adjusted room.`);
  return observation;
}

function suspectWords(
  context: FitContext,
  first: Suspect['readings'][number],
  others: number,
): string {
  const size = first.known ?? sizeWords(context, Math.abs(first.slip), first.unit);
  const [over, under] = WAYS[first.unit];
  const way = first.slip > 0 ? over : under;
  const more =
    others > 0 ? ` ${others} other${others === 1 ? '' : 's'} would explain it as well.` : '';
  return `${first.words}: ${size} ${way}? Measure it again.${more}`;
}

const WAYS = {
  mm: ['too long', 'too short'],
  deg: ['too open', 'too closed'],
  'mm/m': ['too far in', 'too far out'],
} as const;

function sizeWords(context: FitContext, size: number, unit: keyof typeof WAYS): string {
  if (unit === 'mm') return context.words(size);
  return unit === 'deg' ? `${size.toFixed(1)}°` : `${size.toFixed(1)} mm/m`;
}

function settleSteps(context: FitContext, room: AdjustedRoom, suspects: number[]): SettleStep[] {
  const tape = context.book.toolOf(context.lengths[0]?.repeats[0] ?? { toolId: '' });
  const steps = settle(room, {
    ...(suspects.length > 0 ? { suspects } : {}),
    uOfLengthMm: (lengthMm) => lengthUncertainty(tape, lengthMm, 2),
    most: 5,
  });
  return steps.flatMap(({ reading, leastRedundancy, leastRedundancyAfter }) => {
    const asked = askedAs(context, room, reading);
    return asked ? [{ ...asked, leastRedundancy, leastRedundancyAfter }] : [];
  });
}

/** A step as the phone asks for it; a corner without a wall that begins there cannot be named. */
function askedAs(
  context: FitContext,
  room: AdjustedRoom,
  reading: FurtherReading,
): { slot: string; words: string } | null {
  const { walk, rules } = context;
  if (reading.kind === 'again') {
    const observation = observationAt(room, reading.observation);
    const words = observationWords(walk, rules, observation);
    if (isDrawnOnly(observation)) return null;
    return { slot: `again:${observation.readingIds[0] ?? ''}`, words: `${words}, again` };
  }
  const { from, to } = reading;
  if (from.end !== 'left' || to.end !== 'left') return null;
  const name = (wallId: string) => walk.byId.get(wallId)?.wall.name ?? '?';
  return {
    slot: diagonalSlot(from.wallId, to.wallId, planHeight(rules)),
    words: `Diagonal, left of wall ${name(from.wallId)} to left of wall ${name(to.wallId)}`,
  };
}
